using Boltup.Tests.Support;

namespace Boltup.Tests.Reports.Diagnostics;

/// <summary>Compares a text with an approved one in Data/reports.</summary>
internal static class Golden
{
    public static void Check(string name, string actual) => Assert.Equal(File.ReadAllText(Repository.Data("reports", name)), actual);
}
