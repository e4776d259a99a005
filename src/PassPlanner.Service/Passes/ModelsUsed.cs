namespace PassPlanner.Service.Passes;

/// <summary>The models behind every prediction, with their editions and what to know about them.</summary>
public static class ModelsUsed
{
    /// <summary>The models, for a value of UT1-UTC.</summary>
    public static IReadOnlyList<ModelUse> For(double ut1MinusUtcS) =>
    [
        Model("Propagation", "SGP4/SDP4, AIAA 2006-6753, WGS-72, improved mode", "epochs read as UTC"),
        Model("Earth rotation", "GMST 1982 of UT1", ut1MinusUtcS == 0
            ? "UT1-UTC taken as 0: no table is loaded"
            : FormattableString.Invariant($"UT1-UTC {ut1MinusUtcS} s, from the configuration")),
        Model("Station", "WGS-84", "angles are geometric; no light time, no aberration"),
        Model("Apparent elevation", "ITU-R P.834-9 section 4", "above 10 degrees by the cotangent law"),
        Model("Free-space loss", "ITU-R P.525-4", ""),
        Model("Atmosphere", "entered clear-sky zenith loss / sin(elevation)", "nothing where it is not entered; no rain, cloud or scintillation"),
        Model("Sky noise", "ITU-R P.618-14 section 3, galactic background as f^-2.75", "for chains whose noise is entered as components"),
        Model("Pointing", "bias + sky rate x update interval / 2, mean over jitter", "an ideal mount: rates and travel of the axes are not applied"),
        Model("Polarisation", "mismatch of two ellipses, IEEE Std 145", "at most 40 dB"),
    ];

    private static ModelUse Model(string name, string edition, string note) => new() { Name = name, Edition = edition, Note = note };
}
