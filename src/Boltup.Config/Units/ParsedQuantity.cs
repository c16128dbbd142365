namespace Boltup.Config.Units;

/// <summary>What a text like <c>120 N/mm</c> was found to be.</summary>
/// <param name="Si">The value in SI units; zero unless there is no fault.</param>
/// <param name="NumberText">The number as written, empty when there is none.</param>
/// <param name="UnitText">The unit as written, empty when there is none.</param>
/// <param name="Unit">The unit, when it is known.</param>
public readonly record struct ParsedQuantity(QuantityFault Fault, double Si, string NumberText, string UnitText, Unit? Unit);
