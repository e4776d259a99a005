using PassPlanner.Physics.Time;
using PassPlanner.Service.Api;
using PassPlanner.Service.Demo;
using PassPlanner.Service.ElementSets;
using PassPlanner.Service.Health;
using PassPlanner.Service.Jobs;
using PassPlanner.Service.Passes;
using PassPlanner.Service.Problems;
using PassPlanner.Service.Profiles;
using PassPlanner.Service.Radios;
using PassPlanner.Service.Spacecraft;
using PassPlanner.Service.Stations;
using PassPlanner.Service.Status;
using PassPlanner.Service.Validation;
using PassPlanner.Service.Waveforms;
using PassPlanner.Service.Web;
using PassPlanner.Store;

var builder = WebApplication.CreateBuilder(args);
builder.Services.ConfigureHttpJsonOptions(options => WireFormat.Apply(options.SerializerOptions));
builder.Services.AddProblemDetails();
builder.Services.AddExceptionHandler<ProblemExceptionHandler>();
builder.Services.AddOpenApiDescription();
builder.Services.AddResponseCompression(options => options.EnableForHttps = true);
builder.Services.AddPlannerStore();
builder.Services.AddSingleton(TimeProvider.System);
builder.Services.AddSingleton<StationProfiles>();
builder.Services.AddSingleton<SpacecraftProfiles>();
builder.Services.AddSingleton<DemoLoader>();
builder.Services.AddSingleton<ModelCache>();
builder.Services.AddHostedService<WarmUp>();

var app = builder.Build();
app.Services.GetRequiredService<PlannerDatabase>().Migrate();
if (app.Configuration.GetValue("Demo:Enabled", true))
{
    app.Services.GetRequiredService<DemoLoader>().LoadIfEmpty(UtcInstant.From(app.Services.GetRequiredService<TimeProvider>().GetUtcNow()));
}

app.UseExceptionHandler();
app.UseStatusCodePages();
app.UseResponseCompression();
app.UseDashboard();
app.MapOpenApiDescription();
app.MapHealth();

RouteGroupBuilder api = app.MapGroup("/api/v1");
api.MapStations();
api.MapSpacecraft();
api.MapElementSets();
api.MapPasses();
api.MapWaveforms();
api.MapRadioQuestions();
api.MapDemo();
api.MapStatus();
app.MapDashboardPages();
app.Run();

/// <summary>The host, named so that tests can start it.</summary>
public partial class Program;
