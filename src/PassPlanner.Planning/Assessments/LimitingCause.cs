namespace PassPlanner.Planning.Assessments;

/// <summary>What limits a pass, with the values behind it.</summary>
/// <param name="Kind">The cause.</param>
/// <param name="ChangeDb">What it costs, dB, negative or 0.</param>
/// <param name="BelowElevationDeg">Elevation below which the link is not usable, degrees; nothing when it is not usable at all.</param>
/// <param name="ShortByDb">What the best second lacks, dB; 0 when some second closes.</param>
/// <param name="ClosesForS">Seconds for which the link has the required margin, before acquisition.</param>
/// <param name="AcquisitionS">Acquisition time, s.</param>
public sealed record LimitingCause(
    CauseKind Kind,
    double ChangeDb,
    double? BelowElevationDeg,
    double ShortByDb,
    double ClosesForS,
    double AcquisitionS)
{
    /// <summary>No cause: the pass closes.</summary>
    public static readonly LimitingCause None = new(CauseKind.None, 0, null, 0, 0, 0);

    /// <summary>The cause in words; empty when there is none.</summary>
    public string InWords
    {
        get
        {
            if (Kind == CauseKind.None)
            {
                return "";
            }

            if (Kind == CauseKind.Acquisition)
            {
                return FormattableString.Invariant($"Closes for {ClosesForS:0} s, acquisition takes {AcquisitionS:0} s");
            }

            string change = FormattableString.Invariant($"{Math.Abs(ChangeDb):0.0} dB");
            if (ShortByDb > 0)
            {
                string lead = FormattableString.Invariant($"Best second is {ShortByDb:0.0} dB short");
                return Kind == CauseKind.Power
                    ? lead + ", with no loss that explains it: too little power"
                    : $"{lead}; {NameOf(Kind)} costs {change}";
            }

            string name = NameOf(Kind);
            string where = BelowElevationDeg is { } elevationDeg ? FormattableString.Invariant($", below {elevationDeg:0}\u00b0") : "";
            return $"{char.ToUpperInvariant(name[0])}{name[1..]}, \u2212{change}{where}";
        }
    }

    private static string NameOf(CauseKind kind) => kind switch
    {
        CauseKind.Range => "range",
        CauseKind.SpacecraftAntenna => "spacecraft antenna",
        CauseKind.Pointing => "pointing",
        CauseKind.Atmosphere => "atmosphere",
        CauseKind.Polarisation => "polarisation",
        CauseKind.Noise => "noise",
        _ => "power",
    };
}
