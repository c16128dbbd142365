using Boltup.Config.Binding;

namespace Boltup.Config.Documents;

/// <summary>The same source on another receiver.</summary>
public sealed record SecondInstallationDocument(
    Marked<string>? Title,
    IReadOnlyList<FrfFileDocument> InstalledFrfs,
    IReadOnlyList<Marked<string>> Sensors,
    IReadOnlyList<BenchSpectraDocument> Operations);
