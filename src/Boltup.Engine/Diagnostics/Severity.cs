namespace Boltup.Engine.Diagnostics;

/// <summary>How much a diagnostic matters: a note records a liberty taken, a warning a doubt, an error stops the run.</summary>
public enum Severity
{
    Note,
    Warning,
    Error,
}
