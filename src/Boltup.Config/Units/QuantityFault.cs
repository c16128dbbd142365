namespace Boltup.Config.Units;

/// <summary>Why a text is not the quantity that was asked for.</summary>
public enum QuantityFault
{
    None,

    /// <summary>It does not begin with a number, or the number is not finite.</summary>
    NotANumber,

    /// <summary>The number has a decimal comma.</summary>
    DecimalComma,

    /// <summary>A number without a unit.</summary>
    NoUnit,

    /// <summary>The unit is not in the table.</summary>
    UnknownUnit,

    /// <summary>The unit is one of another dimension.</summary>
    WrongDimension,
}
