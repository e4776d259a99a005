using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Antennas;

/// <summary>Kind <c>measured</c>: cuts taken as they are at every frequency of the chain.</summary>
public sealed record MeasuredModel : PatternModel
{
    private readonly MeasuredPattern pattern;

    /// <summary>A pattern of cuts in any order.</summary>
    /// <param name="cuts">One cut or more, no two at the same phi.</param>
    /// <exception cref="ArgumentException">No cut is given, or two stand at the same phi.</exception>
    public MeasuredModel(IReadOnlyList<MeasuredCut> cuts)
    {
        pattern = new MeasuredPattern(cuts);
        Cuts = [.. cuts];
    }

    /// <summary>The cuts as entered.</summary>
    public IReadOnlyList<MeasuredCut> Cuts { get; }

    /// <inheritdoc/>
    public override AntennaPattern At(double frequencyHz)
    {
        Wavelength.CheckFrequency(frequencyHz);
        return pattern;
    }
}
