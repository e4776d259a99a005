using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Antennas;

/// <summary>A pattern in one plane through the boresight, as a function of a signed angle from -pi to pi.</summary>
internal sealed class PlaneCut
{
    private const int StepsPerScale = 24;
    private const int FewestSteps = 720;
    private static readonly double HalfPowerDb = Decibel.FromRatio(2);

    private readonly AntennaPattern pattern;
    private readonly double phiRad;
    private readonly double stepRad;
    private readonly double peakAngleRad;
    private readonly double peakDbi;

    public PlaneCut(AntennaPattern pattern, double phiRad)
    {
        (this.pattern, this.phiRad) = (pattern, phiRad);
        stepRad = Math.Min(pattern.AngularScaleRad / StepsPerScale, Math.PI / FewestSteps);
        peakAngleRad = GainDbi(0) >= pattern.PeakGainDbi - 1e-9 ? 0 : GreatestAngleRad();
        peakDbi = GainDbi(peakAngleRad);
    }

    public Finding<double> HalfPowerBeamwidthDeg() =>
        Edge(1) is { } right && Edge(-1) is { } left
            ? new Found<double>(double.RadiansToDegrees(right - left))
            : new Missing<double>("The gain does not fall to half power on both sides of its greatest value in this plane.");

    /// <summary>The first maximum after the first minimum, going from the peak away from the boresight.</summary>
    public Finding<Sidelobe> FirstSidelobe()
    {
        int side = peakAngleRad < 0 ? -1 : 1;
        bool pastMinimum = false;
        double before = peakDbi;
        double here = GainDbi(peakAngleRad + (side * stepRad));
        for (double angle = peakAngleRad + (side * stepRad); Math.Abs(angle) + stepRad < Math.PI; angle += side * stepRad)
        {
            double after = GainDbi(angle + (side * stepRad));
            pastMinimum |= here < before && here <= after;
            if (pastMinimum && here > before && here >= after)
            {
                double top = MaximumNear(angle);
                return new Found<Sidelobe>(new Sidelobe(peakDbi - GainDbi(top), double.RadiansToDegrees(Math.Abs(top))));
            }

            (before, here) = (here, after);
        }

        return new Missing<Sidelobe>("The gain does not rise again after the main beam in this plane.");
    }

    private double GainDbi(double signedAngleRad) =>
        signedAngleRad >= 0
            ? pattern.GainDbi(signedAngleRad, phiRad)
            : pattern.GainDbi(-signedAngleRad, phiRad + Math.PI);

    private double GreatestAngleRad()
    {
        double best = 0;
        double bestDbi = GainDbi(0);
        for (double angle = stepRad; angle < Math.PI; angle += stepRad)
        {
            foreach (double signed in (ReadOnlySpan<double>)[angle, -angle])
            {
                double gainDbi = GainDbi(signed);
                if (gainDbi > bestDbi)
                {
                    (best, bestDbi) = (signed, gainDbi);
                }
            }
        }

        return MaximumNear(best);
    }

    /// <summary>Where the gain first lies half power below the peak on one side, rad; none when it never does before the antenna's back.</summary>
    private double? Edge(int side)
    {
        double half = peakDbi - HalfPowerDb;
        for (double angle = peakAngleRad; Math.Abs(angle + (side * stepRad)) <= Math.PI; angle += side * stepRad)
        {
            double next = angle + (side * stepRad);
            if (GainDbi(next) <= half)
            {
                return Crossing(angle, next, half);
            }
        }

        return null;
    }

    /// <summary>Where the gain passes a level between an angle above it and one below; a step counts as a crossing.</summary>
    private double Crossing(double aboveRad, double belowRad, double levelDbi)
    {
        for (int i = 0; i < 50; i++)
        {
            double middle = (aboveRad + belowRad) / 2;
            (aboveRad, belowRad) = GainDbi(middle) > levelDbi ? (middle, belowRad) : (aboveRad, middle);
        }

        return (aboveRad + belowRad) / 2;
    }

    /// <summary>Golden-section search within a step of an angle.</summary>
    private double MaximumNear(double angleRad)
    {
        double golden = (Math.Sqrt(5) - 1) / 2;
        double low = angleRad - stepRad;
        double high = angleRad + stepRad;
        for (int i = 0; i < 60; i++)
        {
            double left = high - (golden * (high - low));
            double right = low + (golden * (high - low));
            (low, high) = GainDbi(left) > GainDbi(right) ? (low, right) : (left, high);
        }

        return (low + high) / 2;
    }
}
