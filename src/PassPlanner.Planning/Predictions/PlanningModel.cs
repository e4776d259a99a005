using System.Collections.Concurrent;
using PassPlanner.Physics.Frames;
using PassPlanner.Planning.Links;
using PassPlanner.Planning.Profiles;

namespace PassPlanner.Planning.Predictions;

/// <summary>
/// Everything that predictions are derived from, at one state of the profiles and element sets. It never changes;
/// what it works out once (frames, link tables) it keeps for as long as it lives. Safe to use from many threads.
/// </summary>
public sealed class PlanningModel
{
    private readonly Dictionary<string, Station> stations;
    private readonly Dictionary<string, TrackedSpacecraft> spacecraft;
    private readonly Dictionary<string, TopocentricFrame> frames;
    private readonly GainTables tables = new();
    private readonly ConcurrentDictionary<(string Spacecraft, string Station), IReadOnlyList<LinkChain>> chains = new();

    /// <summary>Takes the profiles; identifiers must be unique in each list.</summary>
    public PlanningModel(IEnumerable<Station> stations, IEnumerable<TrackedSpacecraft> spacecraft)
    {
        Stations = [.. stations.OrderBy(s => s.Id, StringComparer.Ordinal)];
        Spacecraft = [.. spacecraft.OrderBy(s => s.Spacecraft.Id, StringComparer.Ordinal)];
        this.stations = Stations.ToDictionary(s => s.Id, StringComparer.Ordinal);
        this.spacecraft = Spacecraft.ToDictionary(s => s.Spacecraft.Id, StringComparer.Ordinal);
        frames = Stations.ToDictionary(s => s.Id, s => new TopocentricFrame(s.Position), StringComparer.Ordinal);
    }

    /// <summary>Stations, by identifier.</summary>
    public IReadOnlyList<Station> Stations { get; }

    /// <summary>Spacecraft, by identifier.</summary>
    public IReadOnlyList<TrackedSpacecraft> Spacecraft { get; }

    /// <summary>A station by its identifier, or nothing.</summary>
    public Station? FindStation(string id) => stations.GetValueOrDefault(id);

    /// <summary>A spacecraft by its identifier, or nothing.</summary>
    public TrackedSpacecraft? FindSpacecraft(string id) => spacecraft.GetValueOrDefault(id);

    /// <summary>Local frame of a station.</summary>
    public TopocentricFrame FrameOf(Station station) => frames[station.Id];

    /// <summary>Links between a spacecraft and a station, with their tables.</summary>
    public IReadOnlyList<LinkChain> ChainsBetween(Spacecraft craft, Station station) => chains.GetOrAdd(
        (craft.Id, station.Id),
        _ => [.. Link.Between(craft, station).Select(link => new LinkChain(link, craft.Attitude, tables))]);
}
