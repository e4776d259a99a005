using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;
using PassPlanner.Planning.Assessments;
using PassPlanner.Planning.Links;
using PassPlanner.Planning.Passes;
using PassPlanner.Planning.Profiles;

namespace PassPlanner.Planning.Predictions;

/// <summary>From profiles and element sets to assessed passes: the one chain behind lists, timelines and budgets.</summary>
public sealed class PassPredictor(PlanningModel model)
{
    /// <summary>Seconds worked on at a time.</summary>
    private const int StretchS = 1024;

    /// <summary>Predicts all passes of a request; pairs are worked on in parallel, the answer does not depend on it.</summary>
    public Prediction Predict(PredictionRequest request, CancellationToken cancellation)
    {
        var passes = new List<PredictedPass>[request.Spacecraft.Count];
        var without = new List<WithoutPasses>[request.Spacecraft.Count];
        Parallel.For(0, request.Spacecraft.Count, new ParallelOptions { CancellationToken = cancellation }, i =>
        {
            passes[i] = [];
            without[i] = [];
            PredictSpacecraft(request, request.Spacecraft[i], passes[i], without[i], cancellation);
        });

        return new Prediction(
            [.. passes.SelectMany(p => p)
                .OrderBy(p => p.Pass.Window.StartUtc)
                .ThenBy(p => p.Spacecraft.Id, StringComparer.Ordinal)
                .ThenBy(p => p.Station.Id, StringComparer.Ordinal)],
            [.. without.SelectMany(w => w)]);
    }

    /// <summary>The passes of one spacecraft over one station that contain an instant, one for each link wanted.</summary>
    public IReadOnlyList<PredictedPass> PredictAt(
        TrackedSpacecraft craft, Station station, UtcInstant instant, Func<Link, bool> wantsLink, CancellationToken cancellation)
    {
        if (craft.Trajectory is not { } trajectory
            || PassFinder.FindAt(trajectory, model.FrameOf(station), station.Mask, instant, cancellation) is not { } pass)
        {
            return [];
        }

        return Assess(craft.Spacecraft, trajectory, station, pass, ChainsWanted(craft.Spacecraft, station, wantsLink), 0, cancellation);
    }

    private void PredictSpacecraft(
        PredictionRequest request,
        TrackedSpacecraft craft,
        List<PredictedPass> passes,
        List<WithoutPasses> without,
        CancellationToken cancellation)
    {
        Spacecraft spacecraft = craft.Spacecraft;
        if (craft.Trajectory is not { } trajectory)
        {
            without.Add(new WithoutPasses(spacecraft, null, NoPassReason.NoElementSet, $"{spacecraft.Name} has no element set yet"));
            return;
        }

        EphemerisGrid? grid = null;
        foreach (Station station in request.Stations)
        {
            IReadOnlyList<LinkChain> chains = ChainsWanted(spacecraft, station, request.WantsLink);
            if (chains.Count == 0)
            {
                without.Add(new WithoutPasses(
                    spacecraft, station, NoPassReason.NoAntennaForFrequency, $"No chain at {station.Name} covers a wanted frequency of {spacecraft.Name}"));
                continue;
            }

            grid ??= EphemerisGrid.Build(trajectory, request.Period, cancellation);
            PassSearch search = PassFinder.Find(grid, model.FrameOf(station), station.Mask, cancellation);
            foreach (Pass pass in search.Passes)
            {
                passes.AddRange(Assess(spacecraft, trajectory, station, pass, chains, request.ProfileStepS, cancellation));
            }

            Explain(spacecraft, station, search, without);
        }
    }

    private static void Explain(Spacecraft spacecraft, Station station, PassSearch search, List<WithoutPasses> without)
    {
        if (search.Failure is { } failure)
        {
            bool decayed = failure.Status == Sgp4Status.Decayed;
            without.Add(new WithoutPasses(
                spacecraft,
                station,
                decayed ? NoPassReason.Decayed : NoPassReason.PropagationFailed,
                decayed
                    ? $"{spacecraft.Name} has come down by its element set: no position from {failure.FirstUtc.FloorToSecond()}"
                    : $"SGP4 fails from {failure.FirstUtc.FloorToSecond()}: {failure.Status}"));
        }
        else if (search.Passes.Count == 0)
        {
            without.Add(new WithoutPasses(
                spacecraft, station, NoPassReason.NeverUp, $"{spacecraft.Name} stays below the horizon of {station.Name} for the whole period"));
        }
    }

    private IReadOnlyList<LinkChain> ChainsWanted(Spacecraft spacecraft, Station station, Func<Link, bool> wantsLink) =>
        [.. model.ChainsBetween(spacecraft, station).Where(chain => wantsLink(chain.Link))];

    private List<PredictedPass> Assess(
        Spacecraft spacecraft,
        SpacecraftTrajectory trajectory,
        Station station,
        Pass pass,
        IReadOnlyList<LinkChain> chains,
        int profileStepS,
        CancellationToken cancellation)
    {
        UtcInstant first = pass.Window.StartUtc.CeilingToSecond();
        int seconds = (int)Math.Ceiling(pass.Window.EndUtc.SecondsSince(first));
        var track = new PassTrack(Math.Clamp(seconds, 1, StretchS));
        var columns = new LinkColumns(track.Capacity);
        PassAssessor[] assessors = [.. chains.Select(chain => new PassAssessor(chain, profileStepS))];
        for (int done = 0; done < seconds; done += StretchS)
        {
            cancellation.ThrowIfCancellationRequested();
            track.Fill(trajectory, model.FrameOf(station), first.AddSeconds(done), 1, Math.Min(StretchS, seconds - done));
            for (int i = 0; i < chains.Count; i++)
            {
                chains[i].Evaluate(track, columns);
                assessors[i].Add(track, columns);
            }
        }

        ElementSet elementSet = trajectory.ServingSet(pass.MaximumElevationUtc);
        var predicted = new List<PredictedPass>(chains.Count);
        for (int i = 0; i < chains.Count; i++)
        {
            if (assessors[i].Finish() is { } assessment)
            {
                predicted.Add(new PredictedPass(spacecraft, station, chains[i], pass, assessment, elementSet));
            }
        }

        return predicted;
    }
}
