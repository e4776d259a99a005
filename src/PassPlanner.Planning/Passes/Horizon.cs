using MathNet.Numerics.RootFinding;
using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;

namespace PassPlanner.Planning.Passes;

/// <summary>
/// A spacecraft against a station's horizon as functions of time, in seconds from an origin: what the search samples,
/// brackets and solves. A time without a position counts as far below the horizon.
/// </summary>
internal sealed class Horizon(SpacecraftTrajectory trajectory, TopocentricFrame station, HorizonMask mask, UtcInstant originUtc)
{
    private const double Accuracy = 1e-13;
    private const int Iterations = 100;
    private readonly double lowestSine = Math.Sin(double.DegreesToRadians(mask.MinimumDeg));

    /// <summary>The sample of a known state.</summary>
    public HorizonSample SampleOf(double timeS, in EcefState state) => new(
        timeS, station.SinElevation(state.PositionKm) - lowestSine, RateOfSinElevation(state));

    /// <summary>The sample at a time; nothing where there is no position.</summary>
    public HorizonSample? SampleAt(double timeS) =>
        trajectory.TryEcef(UtcOf(timeS), out EcefState state) == Sgp4Status.Ok ? SampleOf(timeS, state) : null;

    /// <summary>Instant of a time.</summary>
    public UtcInstant UtcOf(double timeS) => originUtc.AddSeconds(timeS);

    /// <summary>Direction and range; the propagation must hold at the time.</summary>
    public LookAngles LookAt(double timeS)
    {
        _ = trajectory.TryEcef(UtcOf(timeS), out EcefState state);
        return station.Look(state);
    }

    /// <summary>Elevation above the mask at the azimuth, degrees.</summary>
    public double ExcessDeg(double timeS)
    {
        if (trajectory.TryEcef(UtcOf(timeS), out EcefState state) != Sgp4Status.Ok)
        {
            return -180;
        }

        LookAngles look = station.Look(state);
        return look.ElevationDeg - mask.ElevationDegAt(look.AzimuthDeg);
    }

    /// <summary>
    /// Times at which the spacecraft crosses the least elevation of the mask between two samples: none, one, or two when
    /// it peeps over, or dips under, in between. At most one extreme may lie between the samples.
    /// </summary>
    public void AddCrossings(in HorizonSample before, in HorizonSample after, List<double> crossingsS)
    {
        if (before.IsUp != after.IsUp)
        {
            crossingsS.Add(Root(SineExcess, before.TimeS, after.TimeS));
        }
        else if (before.IsUp ? before.Rate < 0 && after.Rate > 0 : before.Rate > 0 && after.Rate < 0)
        {
            double extremeS = Root(Rate, before.TimeS, after.TimeS);
            if (SineExcess(extremeS) >= 0 != before.IsUp)
            {
                crossingsS.Add(Root(SineExcess, before.TimeS, extremeS));
                crossingsS.Add(Root(SineExcess, extremeS, after.TimeS));
            }
        }
    }

    /// <summary>Time at which the elevation above the mask changes sign between two times of opposite sign.</summary>
    public double MaskCrossing(double beforeS, double afterS) => Root(ExcessDeg, beforeS, afterS);

    /// <summary>
    /// Time near a sampled extreme at which a function of the direction has its extreme: the root of its symmetrical
    /// difference, which needs no derivative (SGP4's velocity is not exactly that of its position).
    /// </summary>
    /// <param name="value">The function.</param>
    /// <param name="beforeS">Time before the extreme.</param>
    /// <param name="afterS">Time after the extreme.</param>
    /// <param name="halfStepS">Half the step of the difference, s.</param>
    /// <param name="otherwiseS">What to answer when there is no extreme between.</param>
    public static double Extreme(Func<double, double> value, double beforeS, double afterS, double halfStepS, double otherwiseS)
    {
        double Difference(double timeS) => value(timeS + halfStepS) - value(timeS - halfStepS);
        double differenceBefore = Difference(beforeS);
        double differenceAfter = Difference(afterS);
        return Math.Sign(differenceBefore) * Math.Sign(differenceAfter) < 0 ? Root(Difference, beforeS, afterS) : otherwiseS;
    }

    private static double Root(Func<double, double> function, double beforeS, double afterS) =>
        Brent.TryFindRoot(function, beforeS, afterS, Accuracy, Iterations, out double rootS) ? rootS : Bisect(function, beforeS, afterS);

    /// <summary>Where the function jumps, between two element sets, Brent's method may give up; halving does not.</summary>
    private static double Bisect(Func<double, double> function, double beforeS, double afterS)
    {
        bool signBefore = function(beforeS) >= 0;
        while (afterS - beforeS > 1e-4)
        {
            double middleS = (beforeS + afterS) / 2;
            (beforeS, afterS) = function(middleS) >= 0 == signBefore ? (middleS, afterS) : (beforeS, middleS);
        }

        return (beforeS + afterS) / 2;
    }

    private double SineExcess(double timeS) =>
        trajectory.TryEcef(UtcOf(timeS), out EcefState state) == Sgp4Status.Ok ? station.SinElevation(state.PositionKm) - lowestSine : -2;

    private double Rate(double timeS) =>
        trajectory.TryEcef(UtcOf(timeS), out EcefState state) == Sgp4Status.Ok ? RateOfSinElevation(state) : 0;

    private double RateOfSinElevation(in EcefState state)
    {
        Vector3D lineOfSight = state.PositionKm - station.PositionKm;
        double rangeKm = lineOfSight.Norm;
        double rangeRate = lineOfSight.Dot(state.VelocityKmPerS) / rangeKm;
        return (state.VelocityKmPerS.Dot(station.Up) - (lineOfSight.Dot(station.Up) / rangeKm * rangeRate)) / rangeKm;
    }
}
