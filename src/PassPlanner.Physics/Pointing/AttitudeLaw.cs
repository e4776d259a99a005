namespace PassPlanner.Physics.Pointing;

/// <summary>How a spacecraft turns: a controlled law that gives its axes, or none (<see cref="UncontrolledAttitude"/>).</summary>
public abstract record AttitudeLaw
{
    private protected AttitudeLaw()
    {
    }
}
