using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Planning;

/// <summary>Diagnostics of planning virtual points.</summary>
public static partial class PlanCodes
{
    public static readonly DiagnosticCode ChannelWithoutData = new(
        "PLN040",
        "a sensor or impact of a virtual point that the data do not have",
        "Every point that a virtual point names must move, or be excited, in at least one of the FRFs. With fewer channels than the document counts on, the virtual point would move otherwise and be judged by less.",
        "virtual_points: { m1: { at: [0 mm, 0 mm, 0 mm], sensors: [s1, s2, s3, s9] } }  # no FRF responds at s9",
        "Give the point the name or `node` that it has in the data, or leave it out of the virtual point.");
}
