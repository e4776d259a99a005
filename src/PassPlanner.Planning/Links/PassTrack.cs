using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;

namespace PassPlanner.Planning.Links;

/// <summary>
/// A stretch of a pass, second by second, as columns: the geometry that every link of a station shares. One object
/// is filled again and again; filling allocates nothing.
/// </summary>
public sealed class PassTrack(int capacity)
{
    private readonly LookAngles[] look = new LookAngles[capacity];
    private readonly double[] skyRateDegPerS = new double[capacity];
    private readonly TemeState[] spacecraftTeme = new TemeState[capacity];
    private readonly Vector3D[] stationTemeKm = new Vector3D[capacity];

    /// <summary>Greatest number of samples.</summary>
    public int Capacity { get; } = capacity;

    /// <summary>Samples filled.</summary>
    public int Count { get; private set; }

    /// <summary>Instant of the first sample.</summary>
    public UtcInstant StartUtc { get; private set; }

    /// <summary>Time between samples, s.</summary>
    public double StepS { get; private set; } = 1;

    /// <summary>Azimuth, elevation, range and range rate.</summary>
    public ReadOnlySpan<LookAngles> Look => look.AsSpan(0, Count);

    /// <summary>Rate of the direction on the sky, degrees/s.</summary>
    public ReadOnlySpan<double> SkyRateDegPerS => skyRateDegPerS.AsSpan(0, Count);

    /// <summary>Spacecraft in TEME axes, km and km/s.</summary>
    public ReadOnlySpan<TemeState> SpacecraftTeme => spacecraftTeme.AsSpan(0, Count);

    /// <summary>Station in TEME axes, km.</summary>
    public ReadOnlySpan<Vector3D> StationTemeKm => stationTemeKm.AsSpan(0, Count);

    /// <summary>Instant of a sample.</summary>
    public UtcInstant UtcOf(int index) => StartUtc.AddSeconds(index * StepS);

    /// <summary>
    /// Fills the columns; stops early where the propagation fails, so that <see cref="Count"/> may end below the number
    /// asked for.
    /// </summary>
    public void Fill(SpacecraftTrajectory trajectory, TopocentricFrame station, UtcInstant startUtc, double stepS, int count)
    {
        ArgumentOutOfRangeException.ThrowIfGreaterThan(count, Capacity);
        StartUtc = startUtc;
        StepS = stepS;
        Count = 0;
        var sweep = default(Sgp4Sweep);
        for (int i = 0; i < count; i++)
        {
            UtcInstant instant = UtcOf(i);
            if (trajectory.TryTeme(instant, ref sweep, out TemeState teme) != Sgp4Status.Ok)
            {
                return;
            }

            JulianDateUt1 ut1 = instant.ToUt1(trajectory.Ut1MinusUtcS);
            EcefState ecef = EarthRotation.ToEcef(teme, ut1);
            LookAngles angles = station.Look(ecef);
            double speedKmPerS = ecef.VelocityKmPerS.Norm;
            double acrossKmPerS = Math.Sqrt(Math.Max(0, (speedKmPerS * speedKmPerS) - (angles.RangeRateKmPerS * angles.RangeRateKmPerS)));

            look[i] = angles;
            skyRateDegPerS[i] = double.RadiansToDegrees(acrossKmPerS / angles.SlantRangeKm);
            spacecraftTeme[i] = teme;
            stationTemeKm[i] = EarthRotation.ToTeme(station.PositionKm, ut1);
            Count = i + 1;
        }
    }
}
