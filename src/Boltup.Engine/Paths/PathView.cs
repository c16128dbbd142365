namespace Boltup.Engine.Paths;

/// <summary>How a response is taken apart; either way the contributions sum to it.</summary>
public enum PathView
{
    /// <summary>By the forces of the operation: force × transfer of the coupled assembly.</summary>
    Forces,

    /// <summary>By the joints of the response's part: joint force × transfer of that part alone.</summary>
    Joints,
}
