using Boltup.Config.Binding;
using Boltup.Config.Yaml;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Documents;

/// <summary>Binds one file of FRFs.</summary>
internal static class FrfFileBinder
{
    public static FrfFileDocument Bind(YamlMap file) => new(
        file["file"]!.File(),
        file["quantity"] is YamlNode quantity ? new(QuantityOf(quantity.Text()), quantity.Span) : null);

    private static FrfQuantity QuantityOf(string name) => name switch
    {
        "receptance" => FrfQuantity.Receptance,
        "mobility" => FrfQuantity.Mobility,
        _ => FrfQuantity.Accelerance,
    };
}
