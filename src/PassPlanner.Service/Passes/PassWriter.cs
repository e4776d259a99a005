using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;
using PassPlanner.Planning.Assessments;
using PassPlanner.Planning.Links;
using PassPlanner.Planning.Passes;
using PassPlanner.Planning.Predictions;

namespace PassPlanner.Service.Passes;

/// <summary>Writes predictions as answers of the API.</summary>
public static class PassWriter
{
    /// <summary>Word of a verdict.</summary>
    public static string WordOf(Verdict verdict) => verdict switch
    {
        Verdict.Closes => "closes",
        Verdict.ClosesInPart => "closesInPart",
        _ => "doesNotClose",
    };

    /// <summary>Word of any other enumeration: its name with a small first letter.</summary>
    public static string WordOf(Enum value)
    {
        string name = value.ToString();
        return char.ToLowerInvariant(name[0]) + name[1..];
    }

    /// <summary>A pass as an item of a list.</summary>
    public static PassResponse Item(PredictedPass predicted) => Fill(predicted, AddressOf(predicted));

    /// <summary>The element set behind a pass and its age at the greatest elevation.</summary>
    public static ElementSetUse ElementSetOf(PredictedPass predicted)
    {
        double ageH = predicted.Pass.MaximumElevationUtc.SecondsSince(predicted.ElementSet.EpochUtc) / 3600;
        double limitH = ElementSetAge.LimitHours(ElementSetAge.ClassOf(predicted.ElementSet));
        return new ElementSetUse
        {
            EpochUtc = predicted.ElementSet.EpochUtc.ToString(),
            AgeH = Math.Round(ageH, 3),
            LimitH = Math.Round(limitH, 1),
            TimingErrorS = Math.Round(ElementSetAge.TimingSigmaS(predicted.ElementSet, ageH / 24), 2),
            IsStale = Math.Abs(ageH) > limitH,
        };
    }

    /// <summary>A link by its names.</summary>
    public static LinkReference ReferenceOf(Link link) => new()
    {
        Direction = WordOf(link.Direction),
        Radio = link.Radio.Id,
        Chain = link.Chain.Id,
    };

    /// <summary>Address of a pass: the spacecraft, the station, and an instant well inside, so that it outlives a new element set.</summary>
    public static PassAddress AddressOf(PredictedPass predicted) => new(
        predicted.Spacecraft.Id,
        predicted.Station.Id,
        InstantOf(predicted.Pass),
        predicted.Chain.Link);

    private static UtcInstant InstantOf(Pass pass)
    {
        UtcInstant second = pass.MaximumElevationUtc.FloorToSecond();
        return pass.Window.Contains(second) ? second : pass.MaximumElevationUtc;
    }

    private static PassResponse Fill(PredictedPass predicted, PassAddress address)
    {
        (Pass pass, Assessment assessment) = (predicted.Pass, predicted.Assessment);
        return new PassResponse
        {
            Spacecraft = predicted.Spacecraft.Id,
            SpacecraftName = predicted.Spacecraft.Name,
            Station = predicted.Station.Id,
            StationName = predicted.Station.Name,
            Antenna = predicted.Chain.Link.Antenna.Id,
            AntennaName = predicted.Chain.Link.Antenna.Name,
            Link = ReferenceOf(predicted.Chain.Link),
            FrequencyHz = predicted.Chain.Link.Radio.FrequencyHz,
            AosUtc = pass.Window.StartUtc.ToString(),
            LosUtc = pass.Window.EndUtc.ToString(),
            AosIsOpen = pass.AosIsOpen,
            LosIsOpen = pass.LosIsOpen,
            DurationS = Math.Round(pass.Window.DurationS, 3),
            MaximumElevationUtc = pass.MaximumElevationUtc.ToString(),
            MaximumElevationDeg = Math.Round(pass.MaximumElevationDeg, 5),
            ClosestApproachUtc = pass.ClosestApproachUtc.ToString(),
            ClosestRangeKm = Math.Round(pass.ClosestRangeKm, 4),
            AosAzimuthDeg = Math.Round(pass.AosAzimuthDeg, 4),
            LosAzimuthDeg = Math.Round(pass.LosAzimuthDeg, 4),
            Verdict = WordOf(assessment.Verdict),
            LimitingCause = assessment.Cause.InWords,
            Cause = new CauseResponse
            {
                Kind = WordOf(assessment.Cause.Kind),
                ChangeDb = Math.Round(assessment.Cause.ChangeDb, 3),
                ShortByDb = Math.Round(assessment.Cause.ShortByDb, 3),
            },
            RequiredMarginDb = predicted.Chain.Link.Radio.RequiredMarginDb,
            HighestMarginDb = Decibels(assessment.HighestMarginDb),
            LowestMarginDb = Decibels(assessment.LowestMarginDb),
            UsableWindows = [.. assessment.UsableWindows.Select(w => new WindowResponse { StartUtc = w.StartUtc.ToString(), EndUtc = w.EndUtc.ToString() })],
            UsableS = assessment.UsableS,
            YieldBytes = Math.Round(assessment.YieldBytes),
            HighestBitRateBps = assessment.HighestBitRateBps,
            UsableElevationFromDeg = Rounded(assessment.UsableFromElevationDeg, 3),
            UsableElevationToDeg = Rounded(assessment.UsableToElevationDeg, 3),
            ElementSet = ElementSetOf(predicted),
            MarginProfile = ProfileOf(predicted),
            PassUrl = address.Of(""),
            TimelineUrl = address.Of("/timeline"),
        };
    }

    /// <summary>Decibels as they are written: ten decimals, so that a budget of twenty lines adds up to 1e-9 dB.</summary>
    public static double Decibels(double valueDb) => Math.Round(valueDb, 10);

    private static double? Rounded(double? value, int decimals) => value is { } number ? Math.Round(number, decimals) : null;

    private static MarginProfileResponse? ProfileOf(PredictedPass predicted) => predicted.Assessment.Profile is not { } profile ? null : new()
    {
        StartUtc = profile.StartUtc.ToString(),
        StepS = profile.StepS,
        RequiredMarginDb = predicted.Chain.Link.Radio.RequiredMarginDb,
        MarginDb = [.. profile.MarginDb.Select(m => Math.Round(m, 2))],
        Usable = [.. profile.Usable.Select(u => u ? 1 : 0)],
    };
}
