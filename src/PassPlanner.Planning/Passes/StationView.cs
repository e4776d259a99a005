using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;

namespace PassPlanner.Planning.Passes;

/// <summary>One spacecraft as one station sees it, by SGP4 itself at any instant. For one search on one thread.</summary>
internal sealed class StationView(SpacecraftTrajectory trajectory, TopocentricFrame station, HorizonMask mask)
{
    private readonly Vector3D east = station.East;
    private readonly Vector3D north = station.North;
    private readonly double constantSin = Math.Sin(mask.MinimumDeg * (Math.PI / 180.0));
    private Sgp4Sweep sweep;

    public HorizonMask Mask { get; } = mask;

    /// <summary>The station, Earth-fixed, km.</summary>
    public Vector3D Position { get; } = station.PositionKm;

    /// <summary>The ellipsoid's normal there.</summary>
    public Vector3D Up { get; } = station.Up;

    /// <summary>Distance of the station from the Earth's centre, km.</summary>
    public double StationRadiusKm { get; } = station.PositionKm.Norm;

    /// <summary>The line of sight at a node.</summary>
    public Sight SightOf(in EphemerisNode node)
    {
        Vector3D sight = node.State.PositionKm - Position;
        double rangeKm = sight.Norm;
        return new Sight(
            sight.Dot(east),
            sight.Dot(north),
            sight.Dot(Up),
            rangeKm,
            node.State.VelocityKmPerS.Dot(Up),
            sight.Dot(node.State.VelocityKmPerS) / rangeKm);
    }

    /// <summary>The node at an instant; false where there is no position.</summary>
    public bool TryNode(UtcInstant instant, out EphemerisNode node)
    {
        Sgp4Status status = trajectory.TryEcef(instant, ref sweep, out EcefState state);
        node = new EphemerisNode(instant, state);
        return status == Sgp4Status.Ok;
    }

    /// <summary>Azimuth, elevation, range and range rate at an instant that has a position.</summary>
    public LookAngles LookAt(UtcInstant instant)
    {
        _ = TryNode(instant, out EphemerisNode node);
        return station.Look(node.State);
    }

    /// <summary>Sine of the elevation less that of the mask at its azimuth: positive above the horizon.</summary>
    public double Clearance(in Sight sight)
        => sight.SinElevation - (Mask.IsConstant ? constantSin : Math.Sin(Mask.ElevationDegAt(sight.AzimuthDeg) * (Math.PI / 180.0)));
}
