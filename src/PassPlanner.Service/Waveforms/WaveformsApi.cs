using System.Text.Json;
using Microsoft.AspNetCore.Http.HttpResults;
using PassPlanner.Physics.Time;
using PassPlanner.Physics.Waveforms;
using PassPlanner.Service.Problems;
using PassPlanner.Service.Profiles;
using PassPlanner.Service.Radios;
using PassPlanner.Service.Validation;
using PassPlanner.Store;

namespace PassPlanner.Service.Waveforms;

/// <summary>Published thresholds and the operator's own waveforms.</summary>
public static class WaveformsApi
{
    /// <summary>Maps the routes.</summary>
    public static void MapWaveforms(this IEndpointRouteBuilder routes)
    {
        RouteGroupBuilder group = routes.MapGroup("/waveforms").WithTags("Waveforms");
        group.MapGet("", List);
        group.MapPost("", Create).Problems(400, 409);
        group.MapDelete("/{id}", Delete).Problems(404);
    }

    /// <summary>Lists the waveforms</summary>
    /// <remarks>Published thresholds with their sources, then the operator's own.</remarks>
    private static Ok<ProfileList<WaveformResponse>> List(WaveformStore store) => TypedResults.Ok(new ProfileList<WaveformResponse>
    {
        Items =
        [
            .. PublishedWaveforms.All.Select(Describe),
            .. store.List().Select(s => Describe(s.Id, JsonSerializer.Deserialize<WaveformDocument>(s.DocumentJson, WireFormat.Options)!)),
        ],
    });

    /// <summary>Adds a waveform of the operator's own</summary>
    private static Created<WaveformResponse> Create(Submitted<WaveformDocument> body, WaveformStore store, TimeProvider clock)
    {
        var errors = new FieldErrors();
        RadioMapper.Waveform(body.Document, "#", errors);
        if (errors.Any)
        {
            throw RequestProblemException.InvalidInput(errors.Items);
        }

        string id = Identifiers.FromName(body.Document.Name!);
        bool isNew = PublishedWaveforms.All.All(p => Identifiers.FromName(p.Name) != id)
            && store.Create(id, JsonSerializer.Serialize(body.Document, WireFormat.Options), UtcInstant.From(clock.GetUtcNow()));
        return isNew
            ? TypedResults.Created($"/api/v1/waveforms/{id}", Describe(id, body.Document))
            : throw new RequestProblemException(
                StatusCodes.Status409Conflict, ProblemTypes.AlreadyExists, "It exists already", $"There is a waveform {DocumentValidator.Quoted(id)} already; give another name");
    }

    /// <summary>Deletes a waveform of the operator's own</summary>
    /// <remarks>Radios keep their copies.</remarks>
    private static NoContent Delete(string id, WaveformStore store) => store.Delete(id)
        ? TypedResults.NoContent()
        : throw RequestProblemException.NotFound($"There is no waveform {DocumentValidator.Quoted(id)} of your own");

    private static WaveformResponse Describe(PublishedWaveform published) => new()
    {
        Id = Identifiers.FromName(published.Name),
        Name = published.Name,
        RequiredEbN0Db = published.RequiredEbN0Db,
        ErrorCriterion = published.ErrorCriterion,
        SpectralEfficiencyBitPerSymbol = published.SpectralEfficiencyBitPerSymbol,
        FrameEfficiency = 1,
        Source = published.Source,
        IsPublished = true,
        IsFromMemory = published.IsFromMemory,
    };

    private static WaveformResponse Describe(string id, WaveformDocument document) => new()
    {
        Id = id,
        Name = document.Name!,
        RequiredEbN0Db = document.RequiredEbN0Db!.Value,
        BitRateBps = document.BitRateBps,
        ImplementationLossDb = document.ImplementationLossDb ?? 0,
        FrameEfficiency = document.FrameEfficiency ?? 1,
        Source = document.Source ?? "entered",
        IsPublished = false,
        IsFromMemory = false,
    };
}
