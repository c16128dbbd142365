namespace Boltup.Engine.Diagnostics;

/// <summary>What an error says about the run; the command line turns it into the exit code.</summary>
public enum ErrorKind
{
    /// <summary>The input is wrong and can be corrected by editing it.</summary>
    WrongInput,

    /// <summary>The input is well formed, but the data cannot support the result that was asked for.</summary>
    UnsupportedByData,
}
