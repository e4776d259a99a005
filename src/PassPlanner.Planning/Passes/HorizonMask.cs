namespace PassPlanner.Planning.Passes;

/// <summary>
/// The horizon of a station by azimuth: linear between its points, and round through north; one point is a constant.
/// Immutable.
/// </summary>
public sealed class HorizonMask
{
    /// <summary>The mask of a station that states none: 5 degrees all round.</summary>
    public static readonly HorizonMask Default = Constant(5.0);

    private readonly double[] azimuthsDeg;
    private readonly double[] elevationsDeg;

    /// <summary>Takes the points in any order.</summary>
    /// <param name="points">At least one point.</param>
    /// <exception cref="ArgumentException">There is no point, an azimuth occurs twice, or a value is outside its range.</exception>
    public HorizonMask(IReadOnlyList<MaskPoint> points)
    {
        ArgumentNullException.ThrowIfNull(points);
        if (points.Count == 0)
        {
            throw new ArgumentException("horizonMask is empty; it must have at least one point.");
        }

        foreach (MaskPoint point in points)
        {
            Check(point);
        }

        Points = Array.AsReadOnly<MaskPoint>([.. points.OrderBy(point => point.AzimuthDeg)]);
        for (int i = 1; i < Points.Count; i++)
        {
            if (Points[i].AzimuthDeg == Points[i - 1].AzimuthDeg)
            {
                throw new ArgumentException(FormattableString.Invariant(
                    $"azimuthDeg is {Points[i].AzimuthDeg} degrees twice; each azimuth of a mask must occur once."));
            }
        }

        azimuthsDeg = [.. Points.Select(point => point.AzimuthDeg)];
        elevationsDeg = [.. Points.Select(point => point.ElevationDeg)];
        MinimumDeg = elevationsDeg.Min();
        MaximumDeg = elevationsDeg.Max();
    }

    /// <summary>Points by azimuth.</summary>
    public IReadOnlyList<MaskPoint> Points { get; }

    /// <summary>Least elevation of the mask, degrees.</summary>
    public double MinimumDeg { get; }

    /// <summary>Greatest elevation of the mask, degrees.</summary>
    public double MaximumDeg { get; }

    /// <summary>Whether the mask is the same all round.</summary>
    public bool IsConstant => MinimumDeg == MaximumDeg;

    /// <summary>A mask that is the same all round.</summary>
    /// <param name="elevationDeg">Elevation, degrees, -5 to 90.</param>
    public static HorizonMask Constant(double elevationDeg) => new([new MaskPoint(0.0, elevationDeg)]);

    /// <summary>Elevation of the horizon at an azimuth, degrees.</summary>
    /// <param name="azimuthDeg">Clockwise from true north, degrees, 0 to 360.</param>
    public double ElevationDegAt(double azimuthDeg)
    {
        int count = azimuthsDeg.Length;
        if (count == 1)
        {
            return elevationsDeg[0];
        }

        int after = IndexAfter(azimuthDeg);
        int before = after == 0 ? count - 1 : after - 1;
        after = after == count ? 0 : after;
        double span = azimuthsDeg[after] - azimuthsDeg[before];
        double part = azimuthDeg - azimuthsDeg[before];
        span = span < 0.0 ? span + 360.0 : span;
        part = part < 0.0 ? part + 360.0 : part;
        return elevationsDeg[before] + ((elevationsDeg[after] - elevationsDeg[before]) * part / span);
    }

    /// <summary>Least and greatest elevation of the horizon between two azimuths, going clockwise.</summary>
    /// <param name="fromAzimuthDeg">First azimuth, degrees, 0 to below 360.</param>
    /// <param name="spanDeg">How far clockwise, degrees, 0 to 360.</param>
    public (double LeastDeg, double GreatestDeg) BoundsDeg(double fromAzimuthDeg, double spanDeg)
    {
        double end = fromAzimuthDeg + spanDeg;
        double first = ElevationDegAt(fromAzimuthDeg);
        double last = ElevationDegAt(end >= 360.0 ? end - 360.0 : end);
        double least = Math.Min(first, last);
        double greatest = Math.Max(first, last);
        for (int i = 0; i < azimuthsDeg.Length; i++)
        {
            double ahead = azimuthsDeg[i] - fromAzimuthDeg;
            if ((ahead < 0.0 ? ahead + 360.0 : ahead) <= spanDeg)
            {
                least = Math.Min(least, elevationsDeg[i]);
                greatest = Math.Max(greatest, elevationsDeg[i]);
            }
        }

        return (least, greatest);
    }

    /// <summary>Index of the first point past an azimuth, or the count of points.</summary>
    private int IndexAfter(double azimuthDeg)
    {
        int low = 0;
        int high = azimuthsDeg.Length;
        while (low < high)
        {
            int middle = (low + high) / 2;
            if (azimuthsDeg[middle] > azimuthDeg)
            {
                high = middle;
            }
            else
            {
                low = middle + 1;
            }
        }

        return low;
    }

    private static void Check(MaskPoint point)
    {
        if (point.AzimuthDeg is not (>= 0.0 and < 360.0))
        {
            throw new ArgumentException(FormattableString.Invariant(
                $"azimuthDeg is {point.AzimuthDeg}; it must be degrees, at least 0 and below 360."));
        }

        if (point.ElevationDeg is not (>= -5.0 and <= 90.0))
        {
            throw new ArgumentException(FormattableString.Invariant(
                $"elevationDeg is {point.ElevationDeg}; it must be degrees, -5 to 90."));
        }
    }
}
