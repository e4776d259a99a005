using PassPlanner.Physics.Antennas;
using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Links;
using PassPlanner.Physics.Pointing;
using PassPlanner.Physics.Waveforms;
using PassPlanner.Planning.Profiles;
using PassPlanner.Service.Radios;
using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Spacecraft;

/// <summary>Builds a spacecraft from a document that has passed the checks of its attributes.</summary>
public static class SpacecraftMapper
{
    private const double DefaultRequiredMarginDb = 3;
    private const double DefaultMinimumElevationDeg = 10;
    private const double DefaultPercentile = 10;

    private static readonly Dictionary<string, string[]> MembersOfAttitude = new(StringComparer.Ordinal)
    {
        ["nadir"] = [],
        ["stationTracking"] = [],
        ["inertial"] = ["quaternion"],
        ["uncontrolled"] = ["percentile"],
    };

    private static readonly Dictionary<string, string[]> MembersOfNeed = new(StringComparer.Ordinal)
    {
        ["contactsPerDay"] = ["count"],
        ["bytesPerDay"] = ["bytes"],
        ["longestGap"] = ["hours"],
    };

    /// <summary>The document with the identifier that it left out.</summary>
    public static SpacecraftDocument WithIdentifiers(SpacecraftDocument document) => document with
    {
        Id = document.Id ?? Identifiers.FromName(document.Name!),
        Revision = null,
        SavedUtc = null,
        IsDemo = null,
    };

    /// <summary>Builds the spacecraft; nothing, and errors, when members do not fit together.</summary>
    public static Planning.Profiles.Spacecraft? Map(SpacecraftDocument document, int revision, FieldErrors errors)
    {
        AttitudeLaw? attitude = Attitude(document.Attitude, "#/attitude", errors);
        var transmitters = new List<Transmitter>();
        for (int i = 0; i < (document.Transmitters?.Count ?? 0); i++)
        {
            AddTransmitter(document.Transmitters![i], $"#/transmitters/{i}", transmitters, errors);
        }

        var receivers = new List<Receiver>();
        for (int i = 0; i < (document.Receivers?.Count ?? 0); i++)
        {
            AddReceiver(document.Receivers![i], $"#/receivers/{i}", receivers, errors);
        }

        Unique.Check(document.Transmitters?.Select(t => t.Id), "#/transmitters", "id", errors);
        Unique.Check(document.Receivers?.Select(r => r.Id), "#/receivers", "id", errors);
        CheckNeeds(document.Needs ?? [], errors);
        if (document.Recorder is { StoredBytes: { } storedBytes, CapacityBytes: { } capacityBytes } && storedBytes > capacityBytes)
        {
            errors.Add("#/recorder/storedBytes", FormattableString.Invariant(
                $"storedBytes is {storedBytes}; it must be at most capacityBytes, {capacityBytes} bytes"));
        }

        return errors.Any ? null : new Planning.Profiles.Spacecraft
        {
            Id = document.Id!,
            Name = document.Name!,
            Revision = revision,
            CatalogNumber = document.CatalogNumber ?? 0,
            Attitude = attitude!,
            Transmitters = transmitters,
            Receivers = receivers,
        };
    }

    private static AttitudeLaw? Attitude(AttitudeDocument? document, string pointer, FieldErrors errors)
    {
        if (document is null)
        {
            return new NadirAttitude();
        }

        string kind = document.Kind!;
        KindMembers.RefuseOthers(document, kind, MembersOfAttitude[kind], pointer, errors);
        switch (kind)
        {
            case "nadir":
                return new NadirAttitude();
            case "stationTracking":
                return new StationTrackingAttitude();
            case "inertial":
                return KindMembers.Require(document.Quaternion, "quaternion", kind, pointer, errors) is { } q
                    ? errors.Try(pointer, () => new InertialAttitude(new Quaternion(q[0], q[1], q[2], q[3])))
                    : null;
            default:
                return new UncontrolledAttitude(document.Percentile ?? DefaultPercentile);
        }
    }

    private static void AddTransmitter(TransmitterDocument document, string pointer, List<Transmitter> transmitters, FieldErrors errors)
    {
        if (Parts(document, pointer, errors) is { } parts)
        {
            transmitters.Add(new Transmitter
            {
                Id = document.Id!,
                FrequencyHz = document.FrequencyHz!.Value,
                RequiredMarginDb = document.RequiredMarginDb ?? DefaultRequiredMarginDb,
                MinimumElevationDeg = document.MinimumElevationDeg ?? DefaultMinimumElevationDeg,
                AcquisitionS = document.AcquisitionS ?? 0,
                Pattern = parts.Pattern,
                Mounting = parts.Mounting,
                Polarisation = parts.Polarisation,
                PolarisationCase = parts.Case,
                Waveforms = parts.Waveforms,
                PowerW = document.PowerW!.Value,
                LineLossDb = document.LineLossDb ?? 0,
            });
        }
    }

    private static void AddReceiver(ReceiverDocument document, string pointer, List<Receiver> receivers, FieldErrors errors)
    {
        if (Parts(document, pointer, errors) is { } parts)
        {
            receivers.Add(new Receiver
            {
                Id = document.Id!,
                FrequencyHz = document.FrequencyHz!.Value,
                RequiredMarginDb = document.RequiredMarginDb ?? DefaultRequiredMarginDb,
                MinimumElevationDeg = document.MinimumElevationDeg ?? DefaultMinimumElevationDeg,
                AcquisitionS = document.AcquisitionS ?? 0,
                Pattern = parts.Pattern,
                Mounting = parts.Mounting,
                Polarisation = parts.Polarisation,
                PolarisationCase = parts.Case,
                Waveforms = parts.Waveforms,
                GOverTDbPerK = document.GOverTDbPerK!.Value,
            });
        }
    }

    private static RadioParts? Parts(RadioDocument document, string pointer, FieldErrors errors)
    {
        PatternModel? pattern = RadioMapper.Pattern(document.Pattern!, pointer + "/pattern", errors);
        if (pattern is not null)
        {
            errors.Try(pointer + "/pattern", () => pattern.At(document.FrequencyHz!.Value));
        }

        Polarisation? polarisation = RadioMapper.Polarisation(document.Polarisation!, pointer + "/polarisation", errors);
        AntennaMounting? mounting = errors.Try(pointer, () => new AntennaMounting(
            document.Boresight is { } b ? new Vector3D(b[0], b[1], b[2]) : new Vector3D(0, 0, 1),
            document.Reference is { } r ? new Vector3D(r[0], r[1], r[2]) : null));
        var waveforms = new List<Waveform>();
        for (int i = 0; i < document.Waveforms!.Count; i++)
        {
            if (RadioMapper.Waveform(document.Waveforms[i], $"{pointer}/waveforms/{i}", errors) is { } waveform)
            {
                waveforms.Add(waveform);
            }
        }

        PolarisationCase polarisationCase = document.PolarisationCase switch
        {
            "mean" => PolarisationCase.Mean,
            "best" => PolarisationCase.Best,
            _ => PolarisationCase.Worst,
        };
        return pattern is null || polarisation is null || mounting is null || waveforms.Count < document.Waveforms.Count
            ? null
            : new RadioParts(pattern, mounting, polarisation, polarisationCase, waveforms);
    }

    private static void CheckNeeds(IReadOnlyList<NeedDocument> needs, FieldErrors errors)
    {
        for (int i = 0; i < needs.Count; i++)
        {
            NeedDocument need = needs[i];
            string pointer = $"#/needs/{i}";
            KindMembers.RefuseOthers(need, need.Kind!, MembersOfNeed[need.Kind!], pointer, errors);
            double? value = need.Kind switch
            {
                "contactsPerDay" => need.Count,
                "bytesPerDay" => need.Bytes,
                _ => need.Hours,
            };
            KindMembers.Require(value, MembersOfNeed[need.Kind!][0], need.Kind!, pointer, errors);
        }
    }

    private sealed record RadioParts(
        PatternModel Pattern, AntennaMounting Mounting, Polarisation Polarisation, PolarisationCase Case, IReadOnlyList<Waveform> Waveforms);
}
