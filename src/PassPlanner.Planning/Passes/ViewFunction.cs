using PassPlanner.Physics.Time;

namespace PassPlanner.Planning.Passes;

/// <summary>A number that the search follows through time.</summary>
internal enum ViewQuantity
{
    /// <summary>Sine of the elevation less that of the mask.</summary>
    Clearance,

    /// <summary>Rate of the sine of the elevation, 1/s.</summary>
    ElevationRate,

    /// <summary>Rate of the range, km/s.</summary>
    RangeRate,

    /// <summary>Component of the line of sight to the east, km.</summary>
    East,
}

/// <summary>One quantity of a view as a function of seconds since an origin; below the horizon where there is no position.</summary>
internal readonly struct ViewFunction(StationView view, ViewQuantity quantity, UtcInstant originUtc)
{
    public double At(double timeS)
    {
        if (!view.TryNode(originUtc.AddSeconds(timeS), out EphemerisNode node))
        {
            return -1.0;
        }

        Sight sight = view.SightOf(node);
        return quantity switch
        {
            ViewQuantity.Clearance => view.Clearance(sight),
            ViewQuantity.ElevationRate => sight.SinElevationRate,
            ViewQuantity.RangeRate => sight.RangeRateKmPerS,
            _ => sight.EastKm,
        };
    }

    /// <summary>
    /// A root between two times of opposite sign, by the method of Chandrupatla (Advances in
    /// Engineering Software 28, 1997): inverse quadratic where it is safe, else halving. Works across a jump too,
    /// such as where another element set takes over.
    /// </summary>
    public double Root(double startS, double endS, double toleranceS)
    {
        const int Iterations = 100;
        (double a, double b) = (endS, startS);
        (double fa, double fb) = (At(a), At(b));
        (double c, double fc) = (a, fa);
        double t = 0.5;
        for (int k = 0; k < Iterations; k++)
        {
            double x = a + (t * (b - a));
            double fx = At(x);
            if (Math.Sign(fx) == Math.Sign(fa))
            {
                (c, fc) = (a, fa);
            }
            else
            {
                (c, fc, b, fb) = (b, fb, a, fa);
            }

            (a, fa) = (x, fx);
            double best = Math.Abs(fa) < Math.Abs(fb) ? a : b;
            double tolerance = toleranceS / (2.0 * Math.Abs(b - a));
            if (tolerance > 0.5 || fa == 0.0)
            {
                return best;
            }

            double xi = (a - b) / (c - b);
            double phi = (fa - fb) / (fc - fb);
            t = phi * phi < xi && (1.0 - phi) * (1.0 - phi) < 1.0 - xi
                ? (fa / (fb - fa) * fc / (fb - fc)) + ((c - a) / (b - a) * fa / (fc - fa) * fb / (fc - fb))
                : 0.5;
            t = Math.Clamp(t, tolerance, 1.0 - tolerance);
        }

        return a;
    }
}
