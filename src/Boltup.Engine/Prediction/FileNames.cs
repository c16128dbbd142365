using System.Text;

namespace Boltup.Engine.Prediction;

/// <summary>The rule by which output files are named after operations, responses and other named things.</summary>
public static class FileNames
{
    /// <summary>Lower case, every run of other characters than letters and digits becomes one hyphen.</summary>
    public static string FromName(string name)
    {
        var result = new StringBuilder(name.Length);
        foreach (char c in name)
        {
            if (char.IsLetterOrDigit(c))
            {
                result.Append(char.ToLowerInvariant(c));
            }
            else if (result.Length == 0 || result[^1] != '-')
            {
                result.Append('-');
            }
        }

        return result.ToString();
    }
}
