using PassPlanner.Planning.Links;

namespace PassPlanner.Service.Passes;

/// <summary>
/// Which links a query means: a direction (downlink, uplink), a radio's identifier, or radio:chain; all when left out.
/// </summary>
public sealed class LinkSelector(string? text, string? antenna)
{
    private readonly string[] parts = text?.Split(':', 2) ?? [];

    /// <summary>Whether a link is meant.</summary>
    public bool Wants(Link link) =>
        (antenna is null || link.Antenna.Id == antenna)
        && parts switch
        {
            [] => true,
            ["downlink"] => link.Direction == LinkDirection.Downlink,
            ["uplink"] => link.Direction == LinkDirection.Uplink,
            [var radio] => link.Radio.Id == radio,
            [var radio, var chain] => link.Radio.Id == radio && link.Chain.Id == chain,
            _ => false,
        };

    /// <summary>The text that means one link alone.</summary>
    public static string TextOf(Link link) => $"{link.Radio.Id}:{link.Chain.Id}";
}
