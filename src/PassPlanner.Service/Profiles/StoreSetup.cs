using PassPlanner.Store;

namespace PassPlanner.Service.Profiles;

/// <summary>Puts the store into the host.</summary>
public static class StoreSetup
{
    private const string FileName = "pass-planner.db";

    /// <summary>Adds the database of Data:Directory (./data when left out) and its stores.</summary>
    public static void AddPlannerStore(this IServiceCollection services)
    {
        services.AddSingleton(provider =>
        {
            string directory = provider.GetRequiredService<IConfiguration>()["Data:Directory"] ?? "data";
            Directory.CreateDirectory(directory);
            return new PlannerDatabase(Path.Combine(directory, FileName));
        });
        services.AddSingleton<ElementSetStore>();
        services.AddSingleton<WaveformStore>();
    }
}
