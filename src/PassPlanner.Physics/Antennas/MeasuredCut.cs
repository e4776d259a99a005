using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Antennas;

/// <summary>Measured gain along one half-plane through the boresight; linear in dB between its points, constant outside them.</summary>
public sealed class MeasuredCut
{
    private readonly double[] anglesRad;
    private readonly double[] gainsDbi;

    /// <summary>A cut of at least two points.</summary>
    /// <param name="phiDeg">Angle of the half-plane about the boresight, degrees, 0 to below 360.</param>
    /// <param name="angleDeg">Off-axis angles, degrees, 0 to 180, strictly increasing.</param>
    /// <param name="gainDbi">Gains, dBi, -100 to 100, one for each angle.</param>
    /// <exception cref="ArgumentException">A value is out of range, out of order or missing.</exception>
    public MeasuredCut(double phiDeg, IReadOnlyList<double> angleDeg, IReadOnlyList<double> gainDbi)
    {
        PhiDeg = phiDeg is >= 0 and < 360 ? phiDeg : throw RangeCheck.Refusal(phiDeg, nameof(phiDeg), "degrees", "from 0 to below 360");
        if (angleDeg.Count < 2)
        {
            throw new ArgumentException($"angleDeg has {angleDeg.Count} value(s); a cut must have at least 2 points", nameof(angleDeg));
        }

        if (gainDbi.Count != angleDeg.Count)
        {
            throw new ArgumentException($"gainDbi has {gainDbi.Count} value(s); it must have one for each of the {angleDeg.Count} angles", nameof(gainDbi));
        }

        anglesRad = new double[angleDeg.Count];
        gainsDbi = new double[angleDeg.Count];
        for (int i = 0; i < anglesRad.Length; i++)
        {
            RangeCheck.Within(angleDeg[i], 0, 180, nameof(angleDeg), "degrees");
            if (i > 0 && angleDeg[i] <= angleDeg[i - 1])
            {
                throw RangeCheck.Refusal(angleDeg[i], nameof(angleDeg), "", "strictly increasing, in degrees");
            }

            anglesRad[i] = double.DegreesToRadians(angleDeg[i]);
            gainsDbi[i] = RangeCheck.Within(gainDbi[i], AntennaPattern.MinimumGainDbi, 100, nameof(gainDbi), "dBi");
        }

        (AngleDeg, GainDbi) = ([.. angleDeg], [.. gainDbi]);
    }

    /// <summary>Angle of the half-plane about the boresight, degrees.</summary>
    public double PhiDeg { get; }

    /// <summary>Off-axis angles, degrees, strictly increasing.</summary>
    public IReadOnlyList<double> AngleDeg { get; }

    /// <summary>Gains, dBi.</summary>
    public IReadOnlyList<double> GainDbi { get; }

    internal IReadOnlyList<double> AnglesRad => anglesRad;

    /// <summary>Gain at an off-axis angle, dBi.</summary>
    /// <param name="offAxisRad">Angle from the boresight, rad.</param>
    public double GainAtDbi(double offAxisRad)
    {
        int after = Array.BinarySearch(anglesRad, offAxisRad);
        if (after >= 0)
        {
            return gainsDbi[after];
        }

        after = ~after;
        if (after == 0 || after == anglesRad.Length)
        {
            return gainsDbi[Math.Min(after, anglesRad.Length - 1)];
        }

        double share = (offAxisRad - anglesRad[after - 1]) / (anglesRad[after] - anglesRad[after - 1]);
        return gainsDbi[after - 1] + (share * (gainsDbi[after] - gainsDbi[after - 1]));
    }
}
