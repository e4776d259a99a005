using Microsoft.AspNetCore.Http.HttpResults;
using Microsoft.AspNetCore.Http.Metadata;
using Microsoft.AspNetCore.Mvc;
using PassPlanner.Exchange.Patterns;
using PassPlanner.Physics.Antennas;
using PassPlanner.Physics.Links;
using PassPlanner.Service.Passes;
using PassPlanner.Service.Problems;
using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Radios;

/// <summary>Single questions about antennas and links: the functions that the passes use, for engineers and scripts.</summary>
public static class RadiosApi
{
    private const long GreatestCutsBytes = 8 * 1024 * 1024;
    private const int MostErrors = 100;

    /// <summary>Maps the routes.</summary>
    public static void MapRadioQuestions(this IEndpointRouteBuilder routes)
    {
        routes.MapPost("/patterns/evaluate", EvaluatePattern).WithTags("Questions").Problems(400);
        routes.MapPost("/patterns/measured-cuts", ReadCuts).WithTags("Questions")
            .WithMetadata(new AcceptsMetadata(["text/csv"], typeof(string)))
            .WithMetadata(new RequestSizeLimitAttribute(GreatestCutsBytes)).Problems(400, 413);
        routes.MapPost("/budgets", EvaluateBudget).WithTags("Questions").Problems(400);
    }

    /// <summary>Evaluates an antenna pattern</summary>
    /// <remarks>Gain at the angles asked for, directivity by integration over the sphere, beamwidth, first sidelobe, effective area.</remarks>
    private static Ok<PatternAnswer> EvaluatePattern(Submitted<PatternQuestion> question)
    {
        PatternQuestion asked = question.Document;
        var errors = new FieldErrors();
        double frequencyHz = asked.FrequencyHz!.Value;
        AntennaPattern? pattern = RadioMapper.PatternAt(asked.Pattern!, frequencyHz, "#/pattern", errors);
        if (pattern is null || errors.Any)
        {
            throw RequestProblemException.InvalidInput(errors.Items);
        }

        double phiRad = double.DegreesToRadians(asked.PhiDeg ?? 0);
        PatternMetrics metrics = PatternMetrics.Of(pattern, frequencyHz, phiRad);
        var leftOut = new List<string>();
        Sidelobe? sidelobe = Found(metrics.FirstSidelobe, leftOut);
        return TypedResults.Ok(new PatternAnswer
        {
            GainDbi = [.. (asked.AngleDeg ?? []).Select(a => PassWriter.Decibels(
                pattern.GainDbi(double.DegreesToRadians(Math.Abs(a)), a < 0 ? phiRad + Math.PI : phiRad)))],
            PeakGainDbi = PassWriter.Decibels(metrics.PeakGainDbi),
            DirectivityDbi = PassWriter.Decibels(metrics.DirectivityDbi),
            EfficiencyRatio = Math.Round(metrics.Efficiency, 6),
            HalfPowerBeamwidthDeg = Found(metrics.HalfPowerBeamwidthDeg, leftOut),
            FirstSidelobeDb = sidelobe?.BelowPeakDb,
            FirstSidelobeAngleDeg = sidelobe?.AngleDeg,
            LeftOut = leftOut,
            EffectiveAreaM2 = metrics.EffectiveAreaM2,
            Pattern = asked.Pattern!,
            FrequencyHz = frequencyHz,
            Models =
            [
                new ModelUse { Name = "Directivity", Edition = "4 pi over the integral of the pattern over the sphere", Note = "" },
                new ModelUse { Name = "Effective area", Edition = "G lambda^2 / 4 pi", Note = "of the peak gain" },
            ],
        });
    }

    /// <summary>Reads measured cuts from CSV</summary>
    /// <remarks>
    /// A header with angleDeg and gainDbi, and phiDeg where there are several cuts; a row for each point. Answers the pattern as
    /// profiles take it; stores nothing.
    /// </remarks>
    private static async Task<Ok<PatternDocument>> ReadCuts(HttpRequest request)
    {
        using var body = new MemoryStream();
        await request.Body.CopyToAsync(body, request.HttpContext.RequestAborted);
        body.Position = 0;
        MeasuredCutReading reading = MeasuredCutReader.Read(body);
        if (reading.Refused.Count > 0)
        {
            throw RequestProblemException.InvalidInput([.. reading.Refused.Take(MostErrors).Select(r =>
                new FieldError($"#/row/{r.Row}", $"row {r.Row}, field {r.Field}: {r.Reason}"))]);
        }

        return TypedResults.Ok(new PatternDocument
        {
            Kind = "measured",
            Cuts = [.. reading.Cuts.Select(c => new CutDocument { PhiDeg = c.PhiDeg, AngleDeg = c.AngleDeg, GainDbi = c.GainDbi })],
        });
    }

    /// <summary>Works out the budget of a link with fixed geometry</summary>
    /// <remarks>Every line with its unit and source; the sums follow from the terms.</remarks>
    private static Ok<BudgetAnswer> EvaluateBudget(Submitted<BudgetQuestion> question)
    {
        BudgetQuestion asked = question.Document;
        var errors = new FieldErrors();
        FixedLinkBudget? budget = errors.Try("#", () => FixedLinkBudget.Of(InputsOf(asked)));
        if (budget is null)
        {
            throw RequestProblemException.InvalidInput(errors.Items);
        }

        var leftOut = new List<string>();
        return TypedResults.Ok(new BudgetAnswer
        {
            Lines = BudgetWriter.Lines(budget.Budget),
            EirpDbw = Found(budget.EirpDbw, leftOut),
            ReceivedPowerDbw = Found(budget.ReceivedPowerDbw, leftOut),
            COverN0DbHz = Found(budget.COverN0DbHz, leftOut),
            COverNDb = Found(budget.COverNDb, leftOut),
            EbN0Db = Found(budget.EbN0Db, leftOut),
            MarginDb = Found(budget.MarginDb, leftOut),
            PowerFluxDensityDbWPerM2 = PassWriter.Decibels(budget.PowerFluxDensityDbWPerM2),
            LeftOut = leftOut,
            Models = [new ModelUse { Name = "Free-space loss", Edition = "ITU-R P.525-4", Note = "when a distance is given" }],
        });
    }

    private static T? Found<T>(Finding<T> finding, List<string> leftOut)
        where T : struct
    {
        switch (finding)
        {
            case Found<T> found:
                return found.Value;
            case Missing<T> missing:
                leftOut.Add(missing.Reason);
                return null;
            default:
                return null;
        }
    }

    private static FixedLinkInputs InputsOf(BudgetQuestion asked) => new()
    {
        FrequencyHz = asked.FrequencyHz!.Value,
        SlantRangeKm = asked.SlantRangeKm,
        FreeSpaceLossDb = asked.FreeSpaceLossDb,
        PowerFluxDensityDbWPerM2 = asked.PowerFluxDensityDbWPerM2,
        EirpDbw = asked.EirpDbw,
        PowerW = asked.PowerW,
        LineLossDb = asked.LineLossDb ?? 0,
        GainDbi = asked.GainDbi ?? 0,
        PointingLossDb = asked.PointingLossDb ?? 0,
        Losses = [.. (asked.Losses ?? []).Select(l => new NamedLoss(l.Name!, l.ValueDb!.Value))],
        GOverTDbPerK = asked.GOverTDbPerK,
        ReceiveGainDbi = asked.ReceiveGainDbi,
        ReceivePointingLossDb = asked.ReceivePointingLossDb ?? 0,
        SystemNoiseTemperatureK = asked.SystemNoiseTemperatureK,
        BitRateBps = asked.BitRateBps,
        NoiseBandwidthHz = asked.NoiseBandwidthHz,
        RequiredEbN0Db = asked.RequiredEbN0Db,
        RequiredCOverNDb = asked.RequiredCOverNDb,
        RequiredReceivedPowerDbw = asked.RequiredReceivedPowerDbw,
        ImplementationLossDb = asked.ImplementationLossDb ?? 0,
    };
}
