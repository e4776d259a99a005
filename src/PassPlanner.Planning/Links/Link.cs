using PassPlanner.Planning.Profiles;

namespace PassPlanner.Planning.Links;

/// <summary>A radio of a spacecraft and a chain of an antenna that covers its frequency.</summary>
/// <param name="Direction">Which way it goes.</param>
/// <param name="Antenna">The station's antenna.</param>
/// <param name="Radio">The spacecraft's radio.</param>
/// <param name="Chain">The antenna's chain.</param>
public sealed record Link(LinkDirection Direction, Antenna Antenna, SpacecraftRadio Radio, AntennaChain Chain)
{
    /// <summary>All links between a spacecraft and a station, in the order of the profiles: downlinks first.</summary>
    public static IReadOnlyList<Link> Between(Spacecraft spacecraft, Station station)
    {
        var links = new List<Link>();
        foreach (Antenna antenna in station.Antennas)
        {
            foreach (Transmitter transmitter in spacecraft.Transmitters)
            {
                links.AddRange(antenna.Receive
                    .Where(chain => chain.Covers(transmitter.FrequencyHz))
                    .Select(chain => new Link(LinkDirection.Downlink, antenna, transmitter, chain)));
            }

            foreach (Receiver receiver in spacecraft.Receivers)
            {
                links.AddRange(antenna.Transmit
                    .Where(chain => chain.Covers(receiver.FrequencyHz))
                    .Select(chain => new Link(LinkDirection.Uplink, antenna, receiver, chain)));
            }
        }

        return links;
    }
}
