namespace Boltup.Engine.Sensitivity;

/// <summary>What is changed a little.</summary>
public enum SensitivityKind
{
    /// <summary>
    /// The dynamic stiffness of a mount in one direction, by one percent with its loss factor as it is; of a coupled mount row and column of
    /// the direction by half a percent each, so that the directions together are the whole mount.
    /// </summary>
    MountStiffness,

    /// <summary>The loss factor of a mount in one direction, by one percent of its value: the imaginary part of the stiffness.</summary>
    MountLoss,

    /// <summary>One force, by 1 dB.</summary>
    Force,

    /// <summary>The FRFs of a part to one of its joined dofs, by 1 dB, as a sensor that reads too much would change them.</summary>
    FrfRow,
}
