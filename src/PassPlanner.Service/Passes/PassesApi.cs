using System.Text;
using Microsoft.AspNetCore.Http.HttpResults;
using PassPlanner.Physics.Links;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;
using PassPlanner.Planning.Assessments;
using PassPlanner.Planning.Links;
using PassPlanner.Planning.Predictions;
using PassPlanner.Service.Problems;
using PassPlanner.Service.Profiles;
using PassPlanner.Service.Radios;
using PassPlanner.Service.Stations;

namespace PassPlanner.Service.Passes;

/// <summary>Passes: derived at every request, never stored.</summary>
public static class PassesApi
{
    private const string Caution =
        "Predicted values. Antennas start to move without warning: keep people clear and follow the station's safety rules. "
        + "Transmit only with a licence and within its limits.";

    /// <summary>Maps the routes.</summary>
    public static void MapPasses(this IEndpointRouteBuilder routes)
    {
        RouteGroupBuilder group = routes.MapGroup("/passes").WithTags("Passes");
        group.MapGet("", List).Problems(400);
        group.MapGet("/{spacecraft}/{station}/{instantUtc}", Get).Problems(400, 404);
        group.MapGet("/{spacecraft}/{station}/{instantUtc}/timeline", Timeline)
            .Produces<TimelineResponse>(200, "application/json", "text/csv").Problems(400, 404);
        group.MapGet("/{spacecraft}/{station}/{instantUtc}/budget", Budget).Problems(400, 404);
        group.MapGet("/{spacecraft}/{station}/{instantUtc}/pointing", Pointing).Problems(400, 404);
    }

    /// <summary>Lists the passes of a period</summary>
    /// <remarks>
    /// Passes that reach into the period, whole, by AOS; one item for each antenna and link. closes=true keeps those with at
    /// least one usable second of positive margin.
    /// </remarks>
    private static Ok<PassListResponse> List(
        HttpRequest request,
        ModelCache cache,
        TimeProvider clock,
        [AsParameters] PassListParameters parameters,
        CancellationToken cancellation)
    {
        PlanningModel model = cache.Current();
        var nowUtc = UtcInstant.From(clock.GetUtcNow());
        PassQuery query = PassQuery.Read(request.Query, model, nowUtc);
        Prediction prediction = new PassPredictor(model).Predict(query.Request, cancellation);
        List<PredictedPass> wanted = [.. prediction.Passes.Where(query.Wants)];
        int CountOf(Verdict verdict) => wanted.Count(p => p.Assessment.Verdict == verdict);
        int shown = query.Offset + query.Limit;
        return TypedResults.Ok(new PassListResponse
        {
            FromUtc = query.Request.Period.StartUtc.ToString(),
            ToUtc = query.Request.Period.EndUtc.ToString(),
            ComputedUtc = nowUtc.ToString(),
            Items = [.. wanted.Skip(query.Offset).Take(query.Limit).Select(PassWriter.Item)],
            Next = shown < wanted.Count ? FormattableString.Invariant($"{shown}") : null,
            Counts = new PassCounts
            {
                Passes = wanted.Count,
                Closes = CountOf(Verdict.Closes),
                ClosesInPart = CountOf(Verdict.ClosesInPart),
                DoesNotClose = CountOf(Verdict.DoesNotClose),
            },
            WithoutPasses = [.. prediction.WithoutPasses.Select(w => new WithoutPassesResponse
            {
                Spacecraft = w.Spacecraft.Id,
                Station = w.Station?.Id,
                Reason = PassWriter.WordOf(w.Reason),
                Detail = w.Detail,
            })],
            Models = ModelsUsed.For(cache.Ut1MinusUtcS),
        });
    }

    /// <summary>Reads one pass</summary>
    /// <remarks>The pass of the spacecraft over the station that contains the instant; by the link of the highest yield when none is named.</remarks>
    private static Ok<PassDetailResponse> Get(
        string spacecraft,
        string station,
        string instantUtc,
        HttpRequest request,
        ModelCache cache,
        [AsParameters] PassLinkParameters parameters,
        CancellationToken cancellation)
    {
        (PlanningModel model, IReadOnlyList<PredictedPass> all) = Find(spacecraft, station, instantUtc, cache, cancellation);
        PredictedPass predicted = Choose(all, new QueryReader(request.Query), "antenna", "link");
        PassAddress address = PassWriter.AddressOf(predicted);
        (double sunAzimuthDeg, double sunElevationDeg) = SunPosition.Look(model.FrameOf(predicted.Station), predicted.Pass.MaximumElevationUtc, cache.Ut1MinusUtcS);
        return TypedResults.Ok(new PassDetailResponse(PassWriter.Item(predicted))
        {
            BudgetUrl = address.Of("/budget"),
            PointingUrl = address.Of("/pointing"),
            StationRevision = predicted.Station.Revision,
            SpacecraftRevision = predicted.Spacecraft.Revision,
            HorizonMask = [.. predicted.Station.Mask.Points.Select(p => new MaskPointDocument { AzimuthDeg = p.AzimuthDeg, ElevationDeg = p.ElevationDeg })],
            Waveforms = [.. predicted.Chain.Ladder.Waveforms.Select((_, index) => WaveformOf(predicted.Chain, index))],
            MostRobustWaveform = predicted.Chain.Ladder.MostRobust,
            BestUtc = predicted.Assessment.BestUtc.ToString(),
            Sun = new SunResponse { AzimuthDeg = Math.Round(sunAzimuthDeg, 3), ElevationDeg = Math.Round(sunElevationDeg, 3) },
            Alternatives = [.. all.Where(p => p != predicted).Select(AlternativeOf)],
            Models = ModelsUsed.For(cache.Ut1MinusUtcS),
        });
    }

    /// <summary>Reads one pass second by second</summary>
    /// <remarks>Columns, as JSON or, with Accept: text/csv, as CSV.</remarks>
    private static IResult Timeline(
        string spacecraft,
        string station,
        string instantUtc,
        HttpRequest request,
        ModelCache cache,
        [AsParameters] TimelineParameters parameters,
        CancellationToken cancellation)
    {
        (PlanningModel model, IReadOnlyList<PredictedPass> all) = Find(spacecraft, station, instantUtc, cache, cancellation);
        var reader = new QueryReader(request.Query);
        int stepS = reader.Whole("stepS", 1, 600, "s") ?? 1;
        string? format = reader.Choice("format", "json", "csv");
        PredictedPass predicted = Choose(all, reader, "antenna", "link", "stepS", "format");
        RefuseTooLong(predicted, stepS);
        TimelineResponse timeline = TimelineBuilder.Build(model, predicted, stepS);
        bool csv = format == "csv" || (format is null && request.Headers.Accept.ToString().Contains("text/csv", StringComparison.Ordinal));
        return csv
            ? TypedResults.Text(TimelineCsv.Write(timeline), "text/csv", Encoding.UTF8)
            : TypedResults.Ok(timeline);
    }

    /// <summary>Reads the link budget of a pass at one instant</summary>
    /// <remarks>Terms in order; they add up to the timeline's margin. At the best second when no instant is named.</remarks>
    private static Ok<BudgetResponse> Budget(
        string spacecraft,
        string station,
        string instantUtc,
        HttpRequest request,
        ModelCache cache,
        [AsParameters] BudgetParameters parameters,
        CancellationToken cancellation)
    {
        (PlanningModel model, IReadOnlyList<PredictedPass> all) = Find(spacecraft, station, instantUtc, cache, cancellation);
        var reader = new QueryReader(request.Query);
        UtcInstant? atUtc = reader.Instant("atUtc");
        int? waveform = reader.Whole("waveform", 0, 63, "");
        PredictedPass predicted = Choose(all, reader, "antenna", "link", "atUtc", "waveform");
        UtcInstant at = atUtc ?? predicted.Assessment.BestUtc;
        if (!predicted.Pass.Window.Contains(at))
        {
            throw RequestProblemException.InvalidMember(
                "atUtc", $"atUtc is {at}; it must be within the pass, from {predicted.Pass.Window.StartUtc} to before {predicted.Pass.Window.EndUtc}");
        }

        WaveformLadder ladder = predicted.Chain.Ladder;
        int chosen = waveform ?? ladder.MostRobust;
        if (chosen >= ladder.Waveforms.Count)
        {
            throw RequestProblemException.InvalidMember(
                "waveform", $"waveform is {chosen}; it must be from 0 to {ladder.Waveforms.Count - 1}, an index of the pass's waveforms");
        }

        return TypedResults.Ok(BudgetAt(model, predicted, at, chosen, cache.Ut1MinusUtcS));
    }

    /// <summary>Reads where to point and which frequency to expect</summary>
    /// <remarks>Apparent elevation and Doppler-corrected frequency, as columns.</remarks>
    private static Ok<PointingResponse> Pointing(
        string spacecraft,
        string station,
        string instantUtc,
        HttpRequest request,
        ModelCache cache,
        [AsParameters] PointingParameters parameters,
        CancellationToken cancellation)
    {
        (PlanningModel model, IReadOnlyList<PredictedPass> all) = Find(spacecraft, station, instantUtc, cache, cancellation);
        var reader = new QueryReader(request.Query);
        int stepS = reader.Whole("stepS", 1, 600, "s") ?? 1;
        PredictedPass predicted = Choose(all, reader, "antenna", "link", "stepS");
        RefuseTooLong(predicted, stepS);
        TimelineResponse timeline = TimelineBuilder.Build(model, predicted, stepS);
        double frequencyHz = predicted.Chain.Link.Radio.FrequencyHz;

        // An uplink is sent the other way off, so that the spacecraft hears its own frequency.
        double sign = predicted.Chain.Link.Direction == LinkDirection.Uplink ? -1 : 1;
        return TypedResults.Ok(new PointingResponse
        {
            StartUtc = timeline.StartUtc,
            StepS = stepS,
            AzimuthDeg = timeline.AzimuthDeg,
            ApparentElevationDeg = timeline.ApparentElevationDeg,
            FrequencyHz = [.. timeline.DopplerHz.Select(d => Math.Round(frequencyHz + (sign * d), 3))],
            Caution = Caution,
        });
    }

    private static (PlanningModel Model, IReadOnlyList<PredictedPass> Passes) Find(
        string spacecraft, string station, string instantUtc, ModelCache cache, CancellationToken cancellation)
    {
        PlanningModel model = cache.Current();
        UtcInstant instant = QueryReader.InstantOfPath("instantUtc", instantUtc);
        TrackedSpacecraft craft = model.FindSpacecraft(spacecraft) ?? throw RequestProblemException.NotFound($"There is no spacecraft {spacecraft}");
        var site = model.FindStation(station) ?? throw RequestProblemException.NotFound($"There is no station {station}");
        IReadOnlyList<PredictedPass> passes = new PassPredictor(model).PredictAt(craft, site, instant, _ => true, cancellation);
        return passes.Count > 0
            ? (model, passes)
            : throw RequestProblemException.NotFound(
                craft.Trajectory is null
                    ? $"{craft.Spacecraft.Name} has no element set yet"
                    : model.ChainsBetween(craft.Spacecraft, site).Count == 0
                        ? $"No chain at {site.Name} covers a frequency of {craft.Spacecraft.Name}"
                        : $"{craft.Spacecraft.Name} is not above the horizon of {site.Name} at {instant}");
    }

    private static PredictedPass Choose(IReadOnlyList<PredictedPass> all, QueryReader reader, params string[] known)
    {
        var selector = new LinkSelector(reader.Text("link"), reader.Text("antenna"));
        reader.Finish(known);
        return all.Where(p => selector.Wants(p.Chain.Link)).MaxBy(p => p.Assessment.YieldBytes)
            ?? throw RequestProblemException.NotFound("The pass has no such antenna or link");
    }

    private static void RefuseTooLong(PredictedPass predicted, int stepS)
    {
        int samples = TimelineBuilder.SampleCount(predicted, stepS);
        if (samples > TimelineBuilder.GreatestSamples)
        {
            throw RequestProblemException.InvalidMember(
                "stepS", $"stepS is {stepS} s, which makes {samples} samples; an answer has at most {TimelineBuilder.GreatestSamples}, so take a greater step");
        }
    }

    private static BudgetResponse BudgetAt(PlanningModel model, PredictedPass predicted, UtcInstant at, int waveform, double ut1MinusUtcS)
    {
        var track = new PassTrack(1);
        var columns = new LinkColumns(1);
        track.Fill(model.FindSpacecraft(predicted.Spacecraft.Id)!.Trajectory!, model.FrameOf(predicted.Station), at, 1, 1);
        predicted.Chain.Evaluate(track, columns);
        LinkBudget budget = PassBudget.Of(predicted.Chain, columns.Samples[0], track.Look[0], waveform);
        return new BudgetResponse
        {
            AtUtc = at.ToString(),
            Waveform = WaveformOf(predicted.Chain, waveform),
            Lines = BudgetWriter.Lines(budget),
            COverN0DbHz = PassWriter.Decibels(budget.ValueDb("cOverN0")),
            EbN0Db = PassWriter.Decibels(budget.ValueDb("ebN0")),
            MarginDb = PassWriter.Decibels(budget.ValueDb("margin")),
            RequiredMarginDb = predicted.Chain.Ladder.RequiredMarginDb,
            AzimuthDeg = Math.Round(track.Look[0].AzimuthDeg, 6),
            ElevationDeg = Math.Round(track.Look[0].ElevationDeg, 6),
            SlantRangeKm = Math.Round(track.Look[0].SlantRangeKm, 6),
            Models = ModelsUsed.For(ut1MinusUtcS),
        };
    }

    private static WaveformUse WaveformOf(LinkChain chain, int index) => new()
    {
        Index = index,
        Name = chain.Ladder.Waveforms[index].Name,
        BitRateBps = chain.Ladder.Waveforms[index].BitRateBps,
        RequiredEbN0Db = chain.Ladder.Waveforms[index].RequiredEbN0Db,
        ImplementationLossDb = chain.Ladder.Waveforms[index].ImplementationLossDb,
    };

    private static AlternativeResponse AlternativeOf(PredictedPass predicted) => new()
    {
        Antenna = predicted.Chain.Link.Antenna.Id,
        AntennaName = predicted.Chain.Link.Antenna.Name,
        Link = PassWriter.ReferenceOf(predicted.Chain.Link),
        Verdict = PassWriter.WordOf(predicted.Assessment.Verdict),
        YieldBytes = Math.Round(predicted.Assessment.YieldBytes),
        PassUrl = PassWriter.AddressOf(predicted).Of(""),
    };
}
