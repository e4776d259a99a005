using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;

namespace PassPlanner.Planning.Passes;

/// <summary>
/// Finds the passes of a spacecraft over a station. Elevation is geometric and is compared with the mask at its azimuth.
/// AOS and LOS are solved on SGP4 itself to better than a millisecond, and no pass or gap longer than 1/4 s is lost
/// (<see cref="CrossingFinder"/> says why). A pass that reaches out of the period is listed whole, up to a day to either side.
/// A pass has the same edges, to the tick, whatever the period asked for.
/// Where another element set takes over between two nodes the path jumps; there a crossing is found by the change of side alone.
/// </summary>
public static class PassFinder
{
    /// <summary>The passes of which any part lies in a period.</summary>
    /// <param name="trajectory">The spacecraft.</param>
    /// <param name="station">The station.</param>
    /// <param name="mask">Its horizon.</param>
    /// <param name="period">Period, not empty, between 1957 and 2100.</param>
    /// <param name="cancellation">Ends the work early.</param>
    public static PassSearch Find(
        SpacecraftTrajectory trajectory, TopocentricFrame station, HorizonMask mask, TimeWindow period, CancellationToken cancellation)
        => Find(EphemerisGrid.Build(trajectory, period, cancellation), station, mask, cancellation);

    /// <summary>The passes of which any part lies in the period of a grid that several stations share.</summary>
    /// <param name="grid">The spacecraft over the period.</param>
    /// <param name="station">The station.</param>
    /// <param name="mask">Its horizon.</param>
    /// <param name="cancellation">Ends the work early.</param>
    public static PassSearch Find(EphemerisGrid grid, TopocentricFrame station, HorizonMask mask, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(grid);
        ArgumentNullException.ThrowIfNull(station);
        ArgumentNullException.ThrowIfNull(mask);
        return new PassHunt(grid, station, mask, cancellation).Run();
    }

    /// <summary>The pass that contains an instant; nothing when the spacecraft is then below the mask or has no position.</summary>
    /// <param name="trajectory">The spacecraft.</param>
    /// <param name="station">The station.</param>
    /// <param name="mask">Its horizon.</param>
    /// <param name="instant">Instant, between 1957 and 2100.</param>
    /// <param name="cancellation">Ends the work early.</param>
    public static Pass? FindAt(
        SpacecraftTrajectory trajectory, TopocentricFrame station, HorizonMask mask, UtcInstant instant, CancellationToken cancellation)
    {
        var moment = new TimeWindow(instant, new UtcInstant(instant.Ticks + 1));
        return Find(trajectory, station, mask, moment, cancellation).Passes.FirstOrDefault(pass => pass.Window.Contains(instant));
    }
}
