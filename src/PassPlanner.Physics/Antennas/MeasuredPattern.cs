namespace PassPlanner.Physics.Antennas;

/// <summary>
/// A pattern of measured cuts. One cut is taken as symmetrical about the boresight. Several are interpolated over both
/// angles, linearly in dB: along the two neighbouring cuts, then between them in phi, which wraps from the last cut to
/// the first; so cuts at phi and phi + 180 degrees are the two sides of one plane.
/// </summary>
public sealed class MeasuredPattern : AntennaPattern
{
    private const double Turn = 2 * Math.PI;
    private readonly MeasuredCut[] cuts;
    private readonly double[] phisRad;
    private readonly double[] kinkAnglesRad;

    /// <summary>A pattern of cuts in any order.</summary>
    /// <param name="cuts">One cut or more, no two at the same phi.</param>
    /// <exception cref="ArgumentException">No cut is given, or two stand at the same phi.</exception>
    public MeasuredPattern(IReadOnlyList<MeasuredCut> cuts)
    {
        if (cuts.Count == 0)
        {
            throw new ArgumentException("cuts is empty; a measured pattern must have at least one cut", nameof(cuts));
        }

        this.cuts = [.. cuts.OrderBy(cut => cut.PhiDeg)];
        phisRad = [.. this.cuts.Select(cut => double.DegreesToRadians(cut.PhiDeg))];
        for (int i = 1; i < phisRad.Length; i++)
        {
            if (phisRad[i] == phisRad[i - 1])
            {
                throw new ArgumentException($"cuts has two cuts at phiDeg {this.cuts[i].PhiDeg}; each phi may stand once", nameof(cuts));
            }
        }

        kinkAnglesRad = [.. cuts.SelectMany(cut => cut.AnglesRad).Distinct().Order()];
        PeakGainDbi = cuts.Max(cut => cut.GainDbi.Max());
        AngularScaleRad = kinkAnglesRad.Skip(1).Zip(kinkAnglesRad, (next, previous) => next - previous).Min();
    }

    /// <inheritdoc/>
    public override double PeakGainDbi { get; }

    /// <inheritdoc/>
    public override bool IsRotationallySymmetric => cuts.Length == 1;

    /// <summary>1: a measured gain has its ohmic loss inside, and says nothing of how much.</summary>
    public override double OhmicEfficiency => 1;

    /// <inheritdoc/>
    public override double AngularScaleRad { get; }

    /// <inheritdoc/>
    internal override IReadOnlyList<double> KinkAnglesRad => kinkAnglesRad;

    /// <inheritdoc/>
    internal override IReadOnlyList<double> KinkPhisRad => cuts.Length == 1 ? [] : phisRad;

    /// <inheritdoc/>
    protected override double EvaluateDbi(double offAxisRad, double phiRad)
    {
        if (cuts.Length == 1)
        {
            return cuts[0].GainAtDbi(offAxisRad);
        }

        double phi = phiRad - (Turn * Math.Floor(phiRad / Turn));
        int found = Array.BinarySearch(phisRad, phi);
        int next = (found >= 0 ? found + 1 : ~found) % cuts.Length;
        int previous = (next + cuts.Length - 1) % cuts.Length;
        double width = phisRad[next] - phisRad[previous];
        double past = phi - phisRad[previous];
        double share = (past < 0 ? past + Turn : past) / (width <= 0 ? width + Turn : width);
        double from = cuts[previous].GainAtDbi(offAxisRad);
        return from + (share * (cuts[next].GainAtDbi(offAxisRad) - from));
    }
}
