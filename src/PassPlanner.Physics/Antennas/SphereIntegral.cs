using MathNet.Numerics.Integration;

namespace PassPlanner.Physics.Antennas;

/// <summary>
/// Integrals over the sphere by Gauss-Legendre panels. Panels are as wide as the pattern's angular scale for the
/// first 128 lobes and then grow by 5 percent each: the far lobes of a narrow beam carry little and are sampled, not followed.
/// </summary>
internal static class SphereIntegral
{
    private const int LobesFollowed = 128;
    private const double Growth = 1.05;
    private static readonly GaussLegendreRule AngleRule = new(-1, 1, 10);
    private static readonly GaussLegendreRule PhiRule = new(-1, 1, 12);
    private static readonly GaussLegendreRule WholeTurnRule = new(-1, 1, 64);

    /// <summary>The integral of a function of the off-axis angle alone, sr times the function's unit.</summary>
    public static double OfSymmetric(Func<double, double> function, double scaleRad, IReadOnlyList<double> kinkAnglesRad)
    {
        double sum = 0;
        double[] edges = Panels(scaleRad, kinkAnglesRad);
        for (int i = 1; i < edges.Length; i++)
        {
            sum += Panel(AngleRule, edges[i - 1], edges[i], angle => Math.Sin(angle) * function(angle));
        }

        return 2 * Math.PI * sum;
    }

    /// <summary>The integral of a function of both angles, sr times the function's unit.</summary>
    public static double Of(
        Func<double, double, double> function,
        double scaleRad,
        IReadOnlyList<double> kinkAnglesRad,
        IReadOnlyList<double> kinkPhisRad)
    {
        GaussLegendreRule phiRule = kinkPhisRad.Count == 0 ? WholeTurnRule : PhiRule;
        double[] phiEdges = kinkPhisRad.Count == 0
            ? [0, 2 * Math.PI]
            : [.. kinkPhisRad, kinkPhisRad[0] + (2 * Math.PI)];
        double meanOverPhi(double angle)
        {
            double sum = 0;
            for (int i = 1; i < phiEdges.Length; i++)
            {
                sum += Panel(phiRule, phiEdges[i - 1], phiEdges[i], phi => function(angle, phi));
            }

            return sum / (2 * Math.PI);
        }

        return OfSymmetric(meanOverPhi, scaleRad, kinkAnglesRad);
    }

    private static double Panel(GaussLegendreRule rule, double from, double to, Func<double, double> function)
    {
        double half = (to - from) / 2;
        double middle = (from + to) / 2;
        double sum = 0;
        for (int i = 0; i < rule.Order; i++)
        {
            sum += rule.GetWeight(i) * function(middle + (half * rule.GetAbscissa(i)));
        }

        return half * sum;
    }

    private static double[] Panels(double scaleRad, IReadOnlyList<double> kinkAnglesRad)
    {
        var edges = new List<double>(kinkAnglesRad) { 0, Math.PI };
        double width = Math.Min(scaleRad, Math.PI / 8);
        double edge = width;
        for (int count = 1; edge < Math.PI; count++)
        {
            edges.Add(edge);
            width *= count > LobesFollowed ? Growth : 1;
            edge += Math.Min(width, Math.PI / 8);
        }

        return [.. edges.Where(x => x is >= 0 and <= Math.PI).Distinct().Order()];
    }
}
