using PassPlanner.Physics.Frames;

namespace PassPlanner.Physics.Pointing;

/// <summary>An attitude that gives the spacecraft's axes at every instant.</summary>
public abstract record ControlledAttitude : AttitudeLaw
{
    private protected ControlledAttitude()
    {
    }

    /// <summary>The body axes.</summary>
    /// <param name="spacecraft">Position (not zero) and velocity of the spacecraft, km and km/s.</param>
    /// <param name="stationPositionKm">Position of the station, km, in the same inertial axes.</param>
    public abstract BodyAxes Axes(in TemeState spacecraft, in Vector3D stationPositionKm);
}
