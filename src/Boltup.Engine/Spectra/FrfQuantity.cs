namespace Boltup.Engine.Spectra;

/// <summary>What an FRF relates: the quantity of the response over the quantity of the excitation.</summary>
/// <remarks>Names of motion over force as in ISO 7626-1: receptance, mobility, accelerance.</remarks>
public readonly record struct FrfQuantity(Quantity Response, Quantity Excitation)
{
    public static readonly FrfQuantity Receptance = new(Quantity.Displacement, Quantity.Force);

    public static readonly FrfQuantity Mobility = new(Quantity.Velocity, Quantity.Force);

    public static readonly FrfQuantity Accelerance = new(Quantity.Acceleration, Quantity.Force);

    /// <summary>Sound pressure over force, Pa/N.</summary>
    public static readonly FrfQuantity PressurePerForce = new(Quantity.Pressure, Quantity.Force);

    /// <summary>
    /// Power of jω by which motion must be divided to become displacement: 0, 1 or 2; 0 for what is no motion.
    /// </summary>
    public static int DerivativeOrder(Quantity quantity) => quantity switch
    {
        Quantity.Velocity => 1,
        Quantity.Acceleration => 2,
        _ => 0,
    };

    /// <summary>The quantity in which the engine holds a response: displacement for motion, otherwise as it is.</summary>
    public static Quantity InternalResponse(Quantity quantity) =>
        quantity is Quantity.Velocity or Quantity.Acceleration ? Quantity.Displacement : quantity;
}
