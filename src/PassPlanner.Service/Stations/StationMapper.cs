using PassPlanner.Physics.Atmosphere;
using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Noise;
using PassPlanner.Planning.Passes;
using PassPlanner.Planning.Profiles;
using PassPlanner.Service.Radios;
using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Stations;

/// <summary>Builds a station from a document that has passed the checks of its attributes.</summary>
public static class StationMapper
{
    private static readonly Dictionary<string, string[]> MembersOfMount = new(StringComparer.Ordinal)
    {
        ["azimuthElevation"] = ["azimuth", "elevation"],
        ["overTheTop"] = ["azimuth", "elevation"],
        ["xY"] = ["x", "y"],
        ["fixed"] = ["fixedAzimuthDeg", "fixedElevationDeg"],
    };

    private static readonly Dictionary<string, string[]> MembersOfNoise = new(StringComparer.Ordinal)
    {
        ["systemTemperature"] = ["systemNoiseTemperatureK"],
        ["gOverT"] = ["gOverTDbPerK"],
        ["components"] = ["receiverNoiseTemperatureK", "lineTemperatureK", "spilloverTemperatureK"],
    };

    /// <summary>The document with the identifiers that it left out.</summary>
    public static StationDocument WithIdentifiers(StationDocument document) => document with
    {
        Id = document.Id ?? Identifiers.FromName(document.Name!),
        Antennas = [.. (document.Antennas ?? []).Select(a => a with { Id = a.Id ?? Identifiers.FromName(a.Name!) })],
        Revision = null,
        SavedUtc = null,
        IsDemo = null,
    };

    /// <summary>Builds the station; nothing, and errors, when members do not fit together.</summary>
    public static Station? Map(StationDocument document, int revision, FieldErrors errors)
    {
        var position = new GeodeticPosition(
            document.Position!.LatitudeDeg!.Value, document.Position.LongitudeDeg!.Value, document.Position.HeightM ?? 0);
        HorizonMask? mask = Mask(document, position.HeightM, errors);
        IReadOnlyList<Antenna> antennas = Each(document.Antennas, "#/antennas", errors, Antenna);
        Unique.Check(document.Antennas?.Select(a => a.Id), "#/antennas", "id", errors);
        return errors.Any ? null : new Station
        {
            Id = document.Id!,
            Name = document.Name!,
            Revision = revision,
            Position = position,
            Mask = mask!,
            Antennas = antennas,
        };
    }

    private static HorizonMask? Mask(StationDocument document, double heightM, FieldErrors errors)
    {
        if (document.HorizonMask is not { } points)
        {
            return HorizonMask.Default;
        }

        for (int i = 1; i < points.Count; i++)
        {
            double azimuthDeg = points[i].AzimuthDeg!.Value;
            if (points.Take(i).Any(p => p.AzimuthDeg == azimuthDeg))
            {
                errors.Add($"#/horizonMask/{i}/azimuthDeg", FormattableString.Invariant(
                    $"azimuthDeg is {azimuthDeg} degrees twice; each azimuth of a mask must occur once"));
                return null;
            }
        }

        bool apparent = document.MaskIsApparent ?? false;
        return errors.Try("#/horizonMask", () => new HorizonMask([.. points.Select(p => new MaskPoint(
            p.AzimuthDeg!.Value,
            apparent ? ItuRP834.GeometricElevationDeg(p.ElevationDeg!.Value, heightM) : p.ElevationDeg!.Value))]));
    }

    private static Antenna? Antenna(AntennaDocument document, string pointer, FieldErrors errors)
    {
        FixedDirection? direction = document.Mount is null ? null : Mount(document.Mount, pointer + "/mount", errors);
        IReadOnlyList<ReceiveChain> receive = Each(document.Receive, pointer + "/receive", errors, Receive);
        IReadOnlyList<TransmitChain> transmit = Each(document.Transmit, pointer + "/transmit", errors, Transmit);
        Unique.Check(document.Receive?.Select(c => c.Id), pointer + "/receive", "id", errors);
        Unique.Check(document.Transmit?.Select(c => c.Id), pointer + "/transmit", "id", errors);
        return new Antenna
        {
            Id = document.Id!,
            Name = document.Name!,
            SetUpS = document.SetUpS ?? 0,
            TearDownS = document.TearDownS ?? 0,
            FixedDirection = direction,
            Pointing = new PointingErrors(
                document.Pointing?.BiasDeg ?? 0, document.Pointing?.JitterRmsDeg ?? 0, document.Pointing?.UpdateIntervalS ?? 0),
            Receive = receive,
            Transmit = transmit,
        };
    }

    private static FixedDirection? Mount(MountDocument document, string pointer, FieldErrors errors)
    {
        KindMembers.RefuseOthers(document, document.Kind!, MembersOfMount[document.Kind!], pointer, errors);
        foreach ((AxisDocument? axis, string name) in new[]
        {
            (document.Azimuth, "azimuth"), (document.Elevation, "elevation"), (document.X, "x"), (document.Y, "y"),
        })
        {
            if (axis is { MinimumDeg: { } minimumDeg, MaximumDeg: { } maximumDeg } && minimumDeg >= maximumDeg)
            {
                errors.Add($"{pointer}/{name}/maximumDeg", FormattableString.Invariant(
                    $"maximumDeg is {maximumDeg}; it must be above minimumDeg, {minimumDeg} degrees"));
            }
        }

        return document.Kind == "fixed" ? new FixedDirection(document.FixedAzimuthDeg ?? 0, document.FixedElevationDeg ?? 90) : null;
    }

    private static ReceiveChain? Receive(ReceiveChainDocument document, string pointer, FieldErrors errors)
    {
        CheckBand(document.FromHz!.Value, document.ToHz!.Value, pointer, errors);
        var pattern = RadioMapper.Pattern(document.Pattern!, pointer + "/pattern", errors);
        var polarisation = RadioMapper.Polarisation(document.Polarisation!, pointer + "/polarisation", errors);
        SystemNoise? noise = Noise(document.Noise!, pointer + "/noise", errors);
        return pattern is null || polarisation is null || noise is null ? null : new ReceiveChain
        {
            Id = document.Id!,
            FromHz = document.FromHz.Value,
            ToHz = document.ToHz.Value,
            Pattern = pattern,
            Polarisation = polarisation,
            LineLossDb = document.LineLossDb ?? 0,
            Noise = noise,
            ClearSkyZenithLossDb = document.ClearSkyZenithLossDb,
        };
    }

    private static TransmitChain? Transmit(TransmitChainDocument document, string pointer, FieldErrors errors)
    {
        CheckBand(document.FromHz!.Value, document.ToHz!.Value, pointer, errors);
        var pattern = RadioMapper.Pattern(document.Pattern!, pointer + "/pattern", errors);
        var polarisation = RadioMapper.Polarisation(document.Polarisation!, pointer + "/polarisation", errors);
        return pattern is null || polarisation is null ? null : new TransmitChain
        {
            Id = document.Id!,
            FromHz = document.FromHz.Value,
            ToHz = document.ToHz.Value,
            PowerW = document.PowerW!.Value,
            Pattern = pattern,
            Polarisation = polarisation,
            LineLossDb = document.LineLossDb ?? 0,
            ClearSkyZenithLossDb = document.ClearSkyZenithLossDb,
        };
    }

    private static SystemNoise? Noise(NoiseDocument document, string pointer, FieldErrors errors)
    {
        string kind = document.Kind!;
        KindMembers.RefuseOthers(document, kind, MembersOfNoise[kind], pointer, errors);
        return kind switch
        {
            "systemTemperature" => KindMembers.Require(document.SystemNoiseTemperatureK, "systemNoiseTemperatureK", kind, pointer, errors) is { } systemK
                ? errors.Try(pointer, () => new SystemTemperatureNoise(systemK))
                : null,
            "gOverT" => KindMembers.Require(document.GOverTDbPerK, "gOverTDbPerK", kind, pointer, errors) is { } gOverTDbPerK
                ? errors.Try(pointer, () => new GOverTNoise(gOverTDbPerK))
                : null,
            _ => KindMembers.Require(document.ReceiverNoiseTemperatureK, "receiverNoiseTemperatureK", kind, pointer, errors) is { } receiverK
                ? errors.Try(pointer, () => new ComponentNoise(
                    receiverK, document.LineTemperatureK ?? NoiseFigure.ReferenceTemperatureK, document.SpilloverTemperatureK ?? 0))
                : null,
        };
    }

    private static void CheckBand(double fromHz, double toHz, string pointer, FieldErrors errors)
    {
        if (toHz < fromHz)
        {
            errors.Add($"{pointer}/toHz", FormattableString.Invariant($"toHz is {toHz}; it must be at least fromHz, {fromHz} Hz"));
        }
    }

    private static List<TDomain> Each<TDocument, TDomain>(
        IReadOnlyList<TDocument>? documents,
        string pointer,
        FieldErrors errors,
        Func<TDocument, string, FieldErrors, TDomain?> map)
        where TDomain : class
    {
        var mapped = new List<TDomain>();
        for (int i = 0; i < (documents?.Count ?? 0); i++)
        {
            if (map(documents![i], $"{pointer}/{i}", errors) is { } built)
            {
                mapped.Add(built);
            }
        }

        return mapped;
    }
}
