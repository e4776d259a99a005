using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Antennas;

/// <summary>
/// A pattern tabulated over the off-axis angle for use every second: two even grids, a fine one over the main beam and
/// its neighbourhood and a coarser one over the rest, linear in dB between nodes; look-ups allocate nothing. A pattern
/// that is not symmetrical is tabulated at its worst over phi.
/// </summary>
public sealed class PatternTable
{
    private const int FineSteps = 512;
    private const int CoarseSteps = 4096;
    private const int PhisSearched = 72;
    private const double FineScales = 4;
    private const double MainBeamDb = 20;

    private readonly Grid fine;

    /// <summary>Most antennas never point that far off, so this part waits until it is asked for.</summary>
    private readonly Lazy<Grid> coarse;
    private readonly Lazy<double> mainBeamErrorDb;

    /// <summary>
    /// The table of a pattern, with the mean over jitter when there is any: in closed form for a Gaussian beam, else by
    /// quadrature over the table without jitter, since a look-up costs a hundredth of the pattern's own formula.
    /// </summary>
    /// <param name="pattern">The pattern.</param>
    /// <param name="jitterRmsRad">Rms of the jitter's angle on the sky, both axes together, rad, 0 to 0.2.</param>
    /// <exception cref="ArgumentOutOfRangeException">The jitter is out of range.</exception>
    public PatternTable(AntennaPattern pattern, double jitterRmsRad = 0)
    {
        RangeCheck.Within(jitterRmsRad, 0, 0.2, nameof(jitterRmsRad), "rad");
        double border = Math.Min(Math.PI, FineScales * pattern.AngularScaleRad);
        Func<double, double> nearDbi = OverAngle(pattern);
        Func<double, double> farDbi = nearDbi;
        if (jitterRmsRad > 0)
        {
            var without = new PatternTable(pattern);
            nearDbi = Mean(pattern, without, JitterQuadrature.Fine, jitterRmsRad);
            farDbi = Mean(pattern, without, JitterQuadrature.Coarse, jitterRmsRad);
        }

        fine = new Grid(nearDbi, 0, border, FineSteps);
        coarse = new Lazy<Grid>(() => new Grid(farDbi, border, Math.PI, border < Math.PI ? CoarseSteps : 1));
        PeakGainDbi = pattern.PeakGainDbi;
        mainBeamErrorDb = new Lazy<double>(() => fine.ErrorAtMidpointsDb(nearDbi, GainDbi(0) - MainBeamDb));
    }

    /// <summary>Peak gain of the pattern without jitter, dBi.</summary>
    public double PeakGainDbi { get; }

    /// <summary>
    /// Worst difference between the table and the pattern, dB, measured half-way between nodes of the fine grid where
    /// the gain lies within 20 dB of the boresight's. Past the fine grid (four times the pattern's angular scale) lobes
    /// narrower than pi / 4096 are sampled, not followed.
    /// </summary>
    public double MainBeamErrorDb => mainBeamErrorDb.Value;

    /// <summary>Gain, dBi.</summary>
    /// <param name="offAxisRad">Angle from the boresight, rad, 0 to pi.</param>
    public double GainDbi(double offAxisRad) =>
        offAxisRad < fine.End ? fine.At(offAxisRad) : coarse.Value.At(offAxisRad);

    private static Func<double, double> Mean(AntennaPattern pattern, PatternTable without, JitterQuadrature quadrature, double jitterRmsRad) =>
        pattern is GaussianBeamPattern beam
            ? angle => beam.MeanGainDbi(angle, jitterRmsRad)
            : angle => quadrature.MeanDbi(without.GainDbi, angle, jitterRmsRad);

    private static Func<double, double> OverAngle(AntennaPattern pattern)
    {
        if (pattern.IsRotationallySymmetric)
        {
            return angle => pattern.GainDbi(angle, 0);
        }

        return angle =>
        {
            double worst = double.PositiveInfinity;
            for (int i = 0; i < PhisSearched; i++)
            {
                worst = Math.Min(worst, pattern.GainDbi(angle, 2 * Math.PI * i / PhisSearched));
            }

            return worst;
        };
    }

    private readonly struct Grid
    {
        private readonly double[] gainsDbi;
        private readonly double start;
        private readonly double step;

        public Grid(Func<double, double> gainDbi, double start, double end, int steps)
        {
            (this.start, End) = (start, end);
            step = (end - start) / steps;
            gainsDbi = new double[steps + 1];
            for (int i = 0; i <= steps; i++)
            {
                gainsDbi[i] = gainDbi(i == steps ? end : start + (i * step));
            }
        }

        public double End { get; }

        public int Steps => gainsDbi.Length - 1;

        public double At(double angle)
        {
            double place = step > 0 ? (angle - start) / step : 0;
            int below = Math.Clamp((int)place, 0, gainsDbi.Length - 2);
            double from = gainsDbi[below];
            return from + (Math.Clamp(place - below, 0, 1) * (gainsDbi[below + 1] - from));
        }

        public double ErrorAtMidpointsDb(Func<double, double> gainDbi, double lowestDbi)
        {
            double worst = 0;
            for (int i = 0; i < Steps; i++)
            {
                double middle = start + ((i + 0.5) * step);
                double exact = gainDbi(middle);
                worst = exact >= lowestDbi ? Math.Max(worst, Math.Abs(At(middle) - exact)) : worst;
            }

            return worst;
        }
    }
}
