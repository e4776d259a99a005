using PassPlanner.Physics.Antennas;
using PassPlanner.Physics.Links;
using PassPlanner.Physics.Waveforms;
using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Radios;

/// <summary>Builds patterns, polarisations and waveforms from documents that have passed the checks of their attributes.</summary>
public static class RadioMapper
{
    private static readonly Dictionary<string, string[]> MembersOfPattern = new(StringComparer.Ordinal)
    {
        ["isotropic"] = ["gainDbi"],
        ["halfWaveDipole"] = ["gainDbi", "ohmicEfficiency"],
        ["gaussianBeam"] = ["gainDbi", "halfPowerBeamwidthDeg", "floorDbi", "ohmicEfficiency"],
        ["taperedAperture"] =
        [
            "diameterM", "edgeTaperDb", "pedestalExponent", "efficiency", "ohmicEfficiency", "blockageDiameterM", "surfaceErrorRmsMm",
            "halfPowerBeamwidthDeg", "halfPowerBeamwidthFrequencyHz",
        ],
        ["measured"] = ["cuts"],
    };

    private static readonly Dictionary<string, string[]> MembersOfPolarisation = new(StringComparer.Ordinal)
    {
        ["rightCircular"] = ["axialRatioDb"],
        ["leftCircular"] = ["axialRatioDb"],
        ["linear"] = ["tiltDeg"],
        ["elliptical"] = ["axialRatioDb", "sense", "tiltDeg"],
    };

    /// <summary>A pattern; nothing, and an error, when its members do not fit together.</summary>
    public static PatternModel? Pattern(PatternDocument document, string pointer, FieldErrors errors)
    {
        KindMembers.RefuseOthers(document, document.Kind!, MembersOfPattern[document.Kind!], pointer, errors);
        return document.Kind switch
        {
            "isotropic" => errors.Try(pointer, () => new IsotropicModel(document.GainDbi ?? 0)),
            "halfWaveDipole" => errors.Try(pointer, () => new HalfWaveDipoleModel(document.GainDbi, document.OhmicEfficiency)),
            "gaussianBeam" => errors.Try(pointer, () => new GaussianBeamModel(
                document.GainDbi, document.HalfPowerBeamwidthDeg, document.FloorDbi, document.OhmicEfficiency)),
            "taperedAperture" => TaperedAperture(document, pointer, errors),
            _ => Measured(document, pointer, errors),
        };
    }

    /// <summary>A pattern at a frequency; nothing, and an error, when it does not exist there.</summary>
    public static AntennaPattern? PatternAt(PatternDocument document, double frequencyHz, string pointer, FieldErrors errors) =>
        Pattern(document, pointer, errors) is { } model ? errors.Try(pointer, () => model.At(frequencyHz)) : null;

    /// <summary>A polarisation; nothing, and an error, when its members do not fit together.</summary>
    public static Polarisation? Polarisation(PolarisationDocument document, string pointer, FieldErrors errors)
    {
        KindMembers.RefuseOthers(document, document.Kind!, MembersOfPolarisation[document.Kind!], pointer, errors);
        switch (document.Kind)
        {
            case "rightCircular":
                return Physics.Links.Polarisation.RightCircular(document.AxialRatioDb ?? 0);
            case "leftCircular":
                return Physics.Links.Polarisation.LeftCircular(document.AxialRatioDb ?? 0);
            case "linear":
                return Physics.Links.Polarisation.Linear(document.TiltDeg);
            default:
                if (KindMembers.Require(document.AxialRatioDb, "axialRatioDb", document.Kind!, pointer, errors) is { } axialRatioDb
                    && KindMembers.Require(document.Sense, "sense", document.Kind!, pointer, errors) is { } sense)
                {
                    return Physics.Links.Polarisation.Elliptical(
                        axialRatioDb, sense == "left" ? RotationSense.Left : RotationSense.Right, document.TiltDeg);
                }

                return null;
        }
    }

    /// <summary>A waveform; nothing, and an error, when a member does not fit.</summary>
    public static Waveform? Waveform(WaveformDocument document, string pointer, FieldErrors errors) => errors.Try(pointer, () => new Waveform(
        document.Name!,
        document.BitRateBps!.Value,
        document.RequiredEbN0Db!.Value,
        document.ImplementationLossDb ?? 0,
        document.FrameEfficiency ?? 1,
        document.OccupiedBandwidthHz,
        document.Source ?? "entered"));

    private static TaperedApertureModel? TaperedAperture(PatternDocument document, string pointer, FieldErrors errors) =>
        KindMembers.Require(document.DiameterM, "diameterM", document.Kind!, pointer, errors) is not { } diameterM
            ? null
            : errors.Try(pointer, () => new TaperedApertureModel(
                diameterM,
                document.EdgeTaperDb,
                document.PedestalExponent ?? 1,
                document.Efficiency,
                document.OhmicEfficiency,
                document.BlockageDiameterM ?? 0,
                document.SurfaceErrorRmsMm ?? 0,
                document.HalfPowerBeamwidthDeg,
                document.HalfPowerBeamwidthFrequencyHz));

    private static MeasuredModel? Measured(PatternDocument document, string pointer, FieldErrors errors)
    {
        if (KindMembers.Require(document.Cuts, "cuts", document.Kind!, pointer, errors) is not { } cuts)
        {
            return null;
        }

        var read = new List<MeasuredCut>();
        for (int i = 0; i < cuts.Count; i++)
        {
            CutDocument cut = cuts[i];
            if (errors.Try($"{pointer}/cuts/{i}", () => new MeasuredCut(cut.PhiDeg ?? 0, cut.AngleDeg!, cut.GainDbi!)) is { } built)
            {
                read.Add(built);
            }
        }

        return read.Count == cuts.Count ? errors.Try(pointer, () => new MeasuredModel(read)) : null;
    }
}
