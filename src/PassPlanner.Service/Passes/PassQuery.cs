using PassPlanner.Physics.Time;
using PassPlanner.Planning.Assessments;
using PassPlanner.Planning.Predictions;

namespace PassPlanner.Service.Passes;

/// <summary>The members of a query for passes, checked.</summary>
public sealed record PassQuery
{
    /// <summary>Longest period of one query, days.</summary>
    public const int LongestPeriodDays = 31;

    private const int DefaultPeriodH = 24;
    private const int DefaultLimit = 200;
    private const int GreatestLimit = 1000;

    /// <summary>What to predict.</summary>
    public required PredictionRequest Request { get; init; }

    /// <summary>Least value of the highest margin, dB; nothing for any.</summary>
    public double? MinimumMarginDb { get; init; }

    /// <summary>Verdict wanted; nothing for any.</summary>
    public Verdict? Verdict { get; init; }

    /// <summary>Whether only passes with a usable second of positive margin are wanted.</summary>
    public required bool ClosingOnly { get; init; }

    /// <summary>Number of passes to skip.</summary>
    public required int Offset { get; init; }

    /// <summary>Greatest number of passes in the answer.</summary>
    public required int Limit { get; init; }

    /// <summary>Reads a query against the profiles.</summary>
    /// <exception cref="Problems.RequestProblemException">A member is wrong.</exception>
    public static PassQuery Read(IQueryCollection query, PlanningModel model, UtcInstant nowUtc)
    {
        var reader = new QueryReader(query);
        UtcInstant fromUtc = reader.Instant("fromUtc") ?? nowUtc.FloorToSecond();
        UtcInstant toUtc = reader.Instant("toUtc") ?? fromUtc.AddSeconds(DefaultPeriodH * 3600);
        if (toUtc <= fromUtc)
        {
            reader.Refuse("toUtc", $"toUtc is {toUtc}; it must be later than fromUtc, {fromUtc}");
        }
        else if (toUtc.SecondsSince(fromUtc) > LongestPeriodDays * 86400.0)
        {
            reader.Refuse("toUtc", $"toUtc is {toUtc}; it must be at most {LongestPeriodDays} days after fromUtc, {fromUtc}");
        }

        var stations = model.Stations;
        if (reader.Text("station") is { } stationId)
        {
            stations = [.. stations.Where(s => s.Id == stationId)];
            RefuseUnknown(reader, "station", stationId, stations.Count);
        }

        var spacecraft = model.Spacecraft;
        if (reader.Text("spacecraft") is { } spacecraftId)
        {
            spacecraft = [.. spacecraft.Where(s => s.Spacecraft.Id == spacecraftId)];
            RefuseUnknown(reader, "spacecraft", spacecraftId, spacecraft.Count);
        }

        string? verdict = reader.Choice("verdict", "closes", "closesInPart", "doesNotClose");
        var selector = new LinkSelector(reader.Text("link"), reader.Text("antenna"));
        var read = new PassQuery
        {
            Request = new PredictionRequest
            {
                Period = new TimeWindow(fromUtc, toUtc),
                Stations = stations,
                Spacecraft = spacecraft,
                WantsLink = selector.Wants,
                ProfileStepS = reader.Whole("profileStepS", 1, 60, "s") ?? 0,
            },
            MinimumMarginDb = reader.Number("minimumMarginDb", -200, 200, "dB"),
            Verdict = verdict switch
            {
                "closes" => Planning.Assessments.Verdict.Closes,
                "closesInPart" => Planning.Assessments.Verdict.ClosesInPart,
                "doesNotClose" => Planning.Assessments.Verdict.DoesNotClose,
                _ => null,
            },
            ClosingOnly = reader.Flag("closes"),
            Offset = reader.Whole("cursor", 0, 1_000_000, "passes") ?? 0,
            Limit = reader.Whole("limit", 1, GreatestLimit, "passes") ?? DefaultLimit,
        };
        reader.Finish(
            "fromUtc", "toUtc", "station", "antenna", "spacecraft", "link", "minimumMarginDb", "verdict", "closes", "limit", "cursor", "profileStepS");
        return read;
    }

    /// <summary>Whether a pass is wanted, once assessed.</summary>
    public bool Wants(PredictedPass pass) =>
        (Verdict is null || pass.Assessment.Verdict == Verdict)
        && (MinimumMarginDb is not { } least || pass.Assessment.HighestMarginDb >= least)
        && (!ClosingOnly || (pass.Assessment.UsableS > 0 && pass.Assessment.HighestMarginDb > 0));

    private static void RefuseUnknown(QueryReader reader, string name, string id, int found)
    {
        if (found == 0)
        {
            reader.Refuse(name, $"{name} is {Validation.DocumentValidator.Quoted(id)}; there is no such {name}");
        }
    }
}
