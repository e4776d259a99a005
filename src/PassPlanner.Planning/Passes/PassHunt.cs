using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Time;

namespace PassPlanner.Planning.Passes;

/// <summary>One search: crossings on the grid, ends outside it where a pass straddles, then the description of each pass.</summary>
internal sealed class PassHunt
{
    /// <summary>How far outside the grid an end is looked for: one day.</summary>
    private const int ReachBlocks = 86400 / EphemerisLattice.BlockS;

    private readonly EphemerisGrid grid;
    private readonly CancellationToken cancellation;
    private readonly StationView view;
    private readonly CrossingFinder finder;
    private readonly EphemerisLattice lattice;

    /// <summary>Nodes before the grid, in blocks going back; each block in order of time, without the node it shares with the next.</summary>
    private readonly List<List<EphemerisNode>> leadBlocks = [];

    /// <summary>Nodes after the grid, in order of time.</summary>
    private readonly List<EphemerisNode> trail = [];

    private bool leadFails;
    private PropagationFailure? trailFailure;

    public PassHunt(EphemerisGrid grid, TopocentricFrame station, HorizonMask mask, CancellationToken cancellation)
    {
        this.grid = grid;
        this.cancellation = cancellation;
        view = new StationView(grid.Trajectory, station, mask);
        finder = new CrossingFinder(view);
        lattice = new EphemerisLattice(grid.Trajectory);
    }

    public PassSearch Run()
    {
        PropagationFailure? failure = FailureInPeriod();
        if (grid.NodeCount == 0)
        {
            return new PassSearch(VisibilityStatus.NeverUp, [], failure);
        }

        var crossings = new List<Crossing>();
        finder.FindAll(grid, crossings);
        List<Stretch> stretches = [.. Stretches(crossings).Where(stretch => stretch.Window.Overlaps(grid.Period))];
        if (stretches.Count == 0)
        {
            return new PassSearch(VisibilityStatus.NeverUp, [], failure);
        }

        bool always = stretches is [var only] && only.Window.StartUtc <= grid.Period.StartUtc && only.Window.EndUtc >= grid.Period.EndUtc;
        IEnumerable<Stretch> listed = stretches is [{ AosIsOpen: true, LosIsOpen: true, CutBy: null }] && !leadFails ? DaysOfPeriod() : stretches;
        var describer = new PassDescriber(view);
        var passes = new List<Pass>();
        foreach (Stretch stretch in listed)
        {
            cancellation.ThrowIfCancellationRequested();
            passes.Add(describer.Describe(stretch.Window, NodesInside(stretch.Window), stretch.AosIsOpen, stretch.LosIsOpen, stretch.CutBy));
        }

        return new PassSearch(always ? VisibilityStatus.AlwaysUp : VisibilityStatus.Passes, passes.AsReadOnly(), failure);
    }

    private PropagationFailure? FailureInPeriod()
    {
        if (grid.Failure is not { } failure || failure.FirstUtc >= grid.Period.EndUtc)
        {
            return null;
        }

        return failure.FirstUtc < grid.Period.StartUtc ? failure with { FirstUtc = grid.Period.StartUtc } : failure;
    }

    /// <summary>Pairs rises with falls; ends that the grid does not show are looked for outside it.</summary>
    private List<Stretch> Stretches(List<Crossing> crossings)
    {
        var stretches = new List<Stretch>();
        bool isUp = view.Clearance(view.SightOf(grid.Nodes[0])) >= 0.0;
        UtcInstant riseUtc = default;
        bool riseIsOpen = false;
        if (isUp)
        {
            // Nothing is looked for when the pass has gone before the period begins.
            bool matters = crossings.Count == 0 || crossings[0].Utc > grid.Period.StartUtc;
            UtcInstant? found = matters ? RiseBeforeGrid() : grid.Nodes[0].Utc;
            riseIsOpen = found is null;
            riseUtc = found ?? (leadFails ? FirstKnown().Utc : MidnightAtOrBefore(grid.Period.StartUtc));
        }

        foreach (Crossing crossing in crossings)
        {
            if (isUp)
            {
                stretches.Add(new Stretch(new TimeWindow(riseUtc, crossing.Utc), riseIsOpen, false, null));
            }
            else
            {
                (riseUtc, riseIsOpen) = (crossing.Utc, false);
            }

            isUp = !isUp;
        }

        if (isUp && riseUtc < grid.Period.EndUtc)
        {
            UtcInstant? found = grid.Failure is null ? FallAfterGrid() : null;
            PropagationFailure? cutBy = found is null ? grid.Failure ?? trailFailure : null;
            UtcInstant endUtc = found ?? cutBy?.FirstUtc ?? MidnightAtOrAfter(grid.Period.EndUtc);
            stretches.Add(new Stretch(new TimeWindow(riseUtc, endUtc), riseIsOpen, found is null, cutBy));
        }

        return stretches;
    }

    private UtcInstant? RiseBeforeGrid()
    {
        var crossings = new List<Crossing>();
        EphemerisNode next = grid.Nodes[0];
        for (int k = 1; k <= ReachBlocks; k++)
        {
            var block = new List<EphemerisNode>();
            if (!lattice.AddBlock(grid.FirstBlock - k, block))
            {
                leadFails = true;
                return null;
            }

            block[^1] = next;
            FindWithin(block, crossings);
            next = block[0];
            block.RemoveAt(block.Count - 1);
            leadBlocks.Add(block);
            if (crossings.Count > 0)
            {
                return crossings[^1].Utc;
            }
        }

        return null;
    }

    private EphemerisNode FirstKnown() => leadBlocks.Count > 0 ? leadBlocks[^1][0] : grid.Nodes[0];

    private UtcInstant? FallAfterGrid()
    {
        var crossings = new List<Crossing>();
        trail.Add(grid.Nodes[^1]);
        for (int k = 1; k <= ReachBlocks; k++)
        {
            int before = trail.Count - 1;
            bool isWhole = lattice.AddBlock(grid.LastBlock + k, trail);
            FindWithin(trail[before..], crossings);
            if (crossings.Count > 0)
            {
                return crossings[0].Utc;
            }

            if (!isWhole)
            {
                trailFailure = lattice.Failure;
                return null;
            }
        }

        return null;
    }

    private void FindWithin(List<EphemerisNode> nodes, List<Crossing> crossings)
    {
        for (int i = 1; i < nodes.Count; i++)
        {
            finder.Find(nodes[i - 1], nodes[i], SegmentBounds.Between(nodes[i - 1], nodes[i]), crossings);
        }
    }

    /// <summary>A spacecraft that never sets: one pass for each UTC day, so that an address means the same pass whatever was asked.</summary>
    private IEnumerable<Stretch> DaysOfPeriod()
    {
        for (UtcInstant startUtc = MidnightAtOrBefore(grid.Period.StartUtc); startUtc < grid.Period.EndUtc; startUtc = startUtc.AddSeconds(86400.0))
        {
            yield return new Stretch(new TimeWindow(startUtc, startUtc.AddSeconds(86400.0)), true, true, null);
        }
    }

    /// <summary>All known nodes strictly inside a window, in order.</summary>
    private List<EphemerisNode> NodesInside(TimeWindow window)
    {
        var inside = new List<EphemerisNode>();
        for (int k = leadBlocks.Count - 1; k >= 0; k--)
        {
            AddInside(leadBlocks[k]);
        }

        EphemerisNode[] nodes = grid.Nodes;
        for (int i = FirstAfter(window.StartUtc); i < nodes.Length && nodes[i].Utc < window.EndUtc; i++)
        {
            inside.Add(nodes[i]);
        }

        // The first node of the trail is the grid's last.
        AddInside(trail.Count > 0 ? trail[1..] : trail);
        return inside;

        void AddInside(List<EphemerisNode> candidates)
            => inside.AddRange(candidates.Where(node => node.Utc > window.StartUtc && node.Utc < window.EndUtc));
    }

    private int FirstAfter(UtcInstant instant)
    {
        int low = 0;
        int high = grid.NodeCount;
        while (low < high)
        {
            int middle = (low + high) / 2;
            (low, high) = grid.Nodes[middle].Utc > instant ? (low, middle) : (middle + 1, high);
        }

        return low;
    }

    private static UtcInstant MidnightAtOrBefore(UtcInstant instant)
    {
        long rest = instant.Ticks % TimeSpan.TicksPerDay;
        return new UtcInstant(instant.Ticks - (rest < 0 ? rest + TimeSpan.TicksPerDay : rest));
    }

    private static UtcInstant MidnightAtOrAfter(UtcInstant instant)
    {
        UtcInstant before = MidnightAtOrBefore(instant);
        return before == instant ? before : before.AddSeconds(86400.0);
    }

    private readonly record struct Stretch(TimeWindow Window, bool AosIsOpen, bool LosIsOpen, PropagationFailure? CutBy);
}
