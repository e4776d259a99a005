using System.Reflection;
using Microsoft.AspNetCore.Http.HttpResults;
using PassPlanner.Physics.Time;
using PassPlanner.Service.Demo;
using PassPlanner.Service.Profiles;
using PassPlanner.Service.Spacecraft;
using PassPlanner.Service.Stations;

namespace PassPlanner.Service.Status;

/// <summary>The service at a glance.</summary>
public static class StatusApi
{
    /// <summary>Maps the routes.</summary>
    public static void MapStatus(this IEndpointRouteBuilder routes) =>
        routes.MapGet("/status", Get).WithTags("Status");

    /// <summary>Reads the service's state</summary>
    private static Ok<StatusResponse> Get(
        TimeProvider clock, StationProfiles stations, SpacecraftProfiles spacecraft, DemoLoader demo, ModelCache cache) =>
        TypedResults.Ok(new StatusResponse
        {
            NowUtc = UtcInstant.From(clock.GetUtcNow()).ToString(),
            Version = Assembly.GetExecutingAssembly().GetCustomAttribute<AssemblyInformationalVersionAttribute>()!.InformationalVersion.Split('+')[0],
            HasDemo = demo.IsLoaded(),
            Stations = stations.Count(),
            Spacecraft = spacecraft.Count(),
            Ut1MinusUtcS = cache.Ut1MinusUtcS,
            Ut1Source = cache.Ut1MinusUtcS == 0 ? "none: UT1 is taken as UTC" : "configuration, EarthOrientation:Ut1MinusUtcS",
        });
}
