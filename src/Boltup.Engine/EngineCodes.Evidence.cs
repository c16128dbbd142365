using Boltup.Engine.Diagnostics;

namespace Boltup.Engine;

/// <summary>What is wrong or doubtful about measurements on a bench.</summary>
public static partial class EngineCodes
{
    public static readonly DiagnosticCode SingularFrf = new(
        "ENG060",
        "interface FRFs are singular",
        "Forces follow from motion by solving with the FRFs between the interface dofs. At a line where these are singular, for instance because two dofs move as one, there is no unique solution.",
        "the same accelerometer listed under two dofs",
        "Leave out a dof that another one implies, or repair the FRF that is zero.",
        ErrorKind.UnsupportedByData);
}
