using Boltup.Engine.Diagnostics;

namespace Boltup.Cli;

/// <summary>What the program tells its caller.</summary>
internal static class ExitCode
{
    public const int Done = 0;

    /// <summary>Done, and a target is missed.</summary>
    public const int TargetMissed = 1;

    /// <summary>Done, and a level rose beyond the tolerance of a comparison, or a target was lost.</summary>
    public const int Regressed = 1;

    /// <summary>The input is wrong.</summary>
    public const int WrongInput = 2;

    /// <summary>The data cannot support the result.</summary>
    public const int UnsupportedByData = 3;

    /// <summary>The program itself failed.</summary>
    public const int Defect = 70;

    public const int Cancelled = 130;

    /// <summary>The code for a run with these diagnostics: wrong input outweighs insufficient data.</summary>
    public static int Of(DiagnosticBag diagnostics)
    {
        Diagnostic[] errors = [.. diagnostics.Items.Where(item => item.Severity == Severity.Error)];
        return errors.Length == 0 ? Done
            : Array.TrueForAll(errors, error => error.Code.Kind == ErrorKind.UnsupportedByData) ? UnsupportedByData
            : WrongInput;
    }
}
