namespace PassPlanner.Planning.Passes;

/// <summary>The horizon of a station by azimuth: linear between its points, and around through north.</summary>
public sealed class HorizonMask
{
    /// <summary>The mask of a station that states none: 5 degrees all round.</summary>
    public static readonly HorizonMask Default = Constant(5);

    private readonly double[] azimuthsDeg;
    private readonly double[] elevationsDeg;

    /// <summary>Takes the points in any order.</summary>
    /// <exception cref="ArgumentException">There is no point, an azimuth occurs twice, or a value is out of range.</exception>
    public HorizonMask(IReadOnlyList<MaskPoint> points)
    {
        if (points.Count == 0)
        {
            throw new ArgumentException("horizonMask is empty; it must have at least one point", nameof(points));
        }

        Points = [.. points.OrderBy(p => p.AzimuthDeg)];
        for (int i = 0; i < Points.Count; i++)
        {
            Check(Points[i], i > 0 ? Points[i - 1].AzimuthDeg : null);
        }

        azimuthsDeg = [.. Points.Select(p => p.AzimuthDeg)];
        elevationsDeg = [.. Points.Select(p => p.ElevationDeg)];
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
    public static HorizonMask Constant(double elevationDeg) => new([new MaskPoint(0, elevationDeg)]);

    /// <summary>Elevation of the horizon at an azimuth, degrees.</summary>
    /// <param name="azimuthDeg">Azimuth, degrees, 0 to 360.</param>
    public double ElevationDegAt(double azimuthDeg)
    {
        int count = azimuthsDeg.Length;
        if (count == 1)
        {
            return elevationsDeg[0];
        }

        int after = Array.BinarySearch(azimuthsDeg, azimuthDeg);
        if (after >= 0)
        {
            return elevationsDeg[after];
        }

        after = ~after % count;
        int before = (after + count - 1) % count;
        double spanDeg = azimuthsDeg[after] - azimuthsDeg[before];
        spanDeg = spanDeg <= 0 ? spanDeg + 360 : spanDeg;
        double partDeg = azimuthDeg - azimuthsDeg[before];
        partDeg = partDeg < 0 ? partDeg + 360 : partDeg;
        return elevationsDeg[before] + ((elevationsDeg[after] - elevationsDeg[before]) * partDeg / spanDeg);
    }

    private static void Check(MaskPoint point, double? azimuthBeforeDeg)
    {
        if (point.AzimuthDeg is not (>= 0 and < 360))
        {
            throw new ArgumentException(FormattableString.Invariant($"azimuthDeg is {point.AzimuthDeg}; it must be at least 0 and below 360 degrees"));
        }

        if (point.ElevationDeg is not (>= -5 and < 90))
        {
            throw new ArgumentException(FormattableString.Invariant($"elevationDeg is {point.ElevationDeg}; it must be at least -5 and below 90 degrees"));
        }

        if (point.AzimuthDeg == azimuthBeforeDeg)
        {
            throw new ArgumentException(FormattableString.Invariant($"azimuthDeg is {point.AzimuthDeg} degrees twice; each azimuth of a mask must occur once"));
        }
    }
}
