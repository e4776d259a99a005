using PassPlanner.Physics.Time;
using PassPlanner.Planning.Predictions;
using PassPlanner.Service.Profiles;

namespace PassPlanner.Service.Jobs;

/// <summary>
/// Predicts the first day once in the background after the start, so that the first page does not wait for link tables
/// and for code that has not been compiled yet. What it works out is kept by the model; its answer is not.
/// </summary>
public sealed class WarmUp(ModelCache cache, TimeProvider clock) : BackgroundService
{
    private const double PeriodS = 86400;

    /// <inheritdoc/>
    protected override Task ExecuteAsync(CancellationToken stoppingToken) => Task.Run(
        () =>
        {
            PlanningModel model = cache.Current();
            UtcInstant nowUtc = UtcInstant.From(clock.GetUtcNow()).FloorToSecond();
            new PassPredictor(model).Predict(
                new PredictionRequest
                {
                    Period = new TimeWindow(nowUtc, nowUtc.AddSeconds(PeriodS)),
                    Stations = model.Stations,
                    Spacecraft = model.Spacecraft,
                    WantsLink = _ => true,
                },
                stoppingToken);
        },
        stoppingToken);
}
