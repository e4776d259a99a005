namespace PassPlanner.Physics.Links;

/// <summary>A value that a question may or may not have: either <see cref="Found{T}"/> or <see cref="Missing{T}"/> with the reason.</summary>
/// <typeparam name="T">Type of the value.</typeparam>
public abstract record Finding<T>
{
    private protected Finding()
    {
    }
}
