using Boltup.Engine.Diagnostics;

namespace Boltup.Config;

/// <summary>Brings diagnostics into the order in which a reader meets their places.</summary>
internal static class PlaceOrder
{
    /// <summary>
    /// Files in the order in which they first occur, places downwards in each, and last what was cut short; equal places stay as they are.
    /// </summary>
    public static IEnumerable<Diagnostic> Of(IReadOnlyList<Diagnostic> diagnostics) =>
        diagnostics.GroupBy(item => item.Span?.File)
            .SelectMany(file => file.OrderBy(item => item.Code == ConfigCodes.TooLarge)
                .ThenBy(item => item.Span?.Line).ThenBy(item => item.Span?.Column));
}
