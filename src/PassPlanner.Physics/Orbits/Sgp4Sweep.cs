namespace PassPlanner.Physics.Orbits;

/// <summary>
/// Where the resonance integrator of the last propagation stood. A caller that steps through time keeps one of
/// these per sweep and passes it by reference: the integrator then goes on from there instead of from the epoch.
/// The answers are the same, bit for bit, with and without it. The default value is ready for use with any
/// propagator; one value must not be shared between threads.
/// </summary>
public struct Sgp4Sweep
{
    internal Sgp4Propagator? Owner;
    internal double TimeMin;
    internal double MeanLongitudeRad;
    internal double MeanMotionRadPerMin;
}
