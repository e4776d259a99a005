using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;
using PassPlanner.Tests;

namespace PassPlanner.Physics.Tests.Orbits;

public sealed class Sgp4PropagatorTests
{
    private static readonly IReadOnlyList<ElementSet> Sets = TestElementSets.Read("orbit/sgp4-verification.tle");

    public static TheoryData<int> Cases => [.. Enumerable.Range(0, Sets.Count)];

    [Theory]
    [MemberData(nameof(Cases))]
    public void A_sweep_gives_the_same_bits_as_single_propagations_in_any_order(int index)
    {
        var propagator = new Sgp4Propagator(Sets[index]);
        Sgp4Sweep sweep = default;
        foreach (double minutes in (double[])[0, 100, 719.9, 720, 721, 5000, 4000, -10, -2000, -100, 3000, 3000, 0, 1500])
        {
            Sgp4Status single = propagator.TryPropagate(minutes, out TemeState expected);
            Sgp4Status swept = propagator.TryPropagate(minutes, ref sweep, out TemeState actual);
            Assert.Equal(single, swept);
            Assert.Equal(expected, actual);
        }
    }

    [Fact]
    public void A_sweep_may_move_from_one_propagator_to_another()
    {
        Sgp4Sweep sweep = default;
        foreach (Sgp4Propagator propagator in Sets.Select(set => new Sgp4Propagator(set)))
        {
            propagator.TryPropagate(2000, out TemeState expected);
            propagator.TryPropagate(2000, ref sweep, out TemeState actual);
            Assert.Equal(expected, actual);
        }
    }

    [Fact]
    public async Task Two_threads_on_one_propagator_get_the_results_of_one()
    {
        Sgp4Propagator[] propagators = [.. Sets.Select(set => new Sgp4Propagator(set))];
        TemeState[] Run(int first, int step) => [.. from k in Enumerable.Range(0, 200)
                                                   let minutes = (first + (k * step)) % 200 * 30.0
                                                   orderby minutes
                                                   from propagator in propagators
                                                   select propagator.TryPropagate(minutes, out TemeState state) == Sgp4Status.Ok ? state : default];
        TemeState[] expected = Run(0, 1);
        TemeState[][] both = await Task.WhenAll(Task.Run(() => Run(0, 1)), Task.Run(() => Run(199, 199)));
        Assert.Equal(expected, both[0]);
        Assert.Equal(expected, both[1]);
    }

    [Fact]
    public void Propagation_allocates_nothing()
    {
        Sgp4Propagator[] propagators = [.. Sets.Select(set => new Sgp4Propagator(set))];
        foreach (int repeat in (int[])[1, 2])
        {
            long before = GC.GetAllocatedBytesForCurrentThread();
            foreach (Sgp4Propagator propagator in propagators)
            {
                propagator.TryPropagate(1000.0 * repeat, out _);
            }

            Assert.True(repeat == 1 || GC.GetAllocatedBytesForCurrentThread() == before);
        }
    }

    [Fact]
    public void Velocity_is_the_derivative_of_position_to_the_theory_s_own_consistency()
    {
        const double TenthOfAMetrePerSecondKmPerS = 1e-4;
        var propagator = new Sgp4Propagator(Sets.First(set => set.CatalogNumber == 6251));
        for (double minutes = 0; minutes < 1440; minutes += 7)
        {
            propagator.TryPropagate(minutes - (1 / 60.0), out TemeState before);
            propagator.TryPropagate(minutes + (1 / 60.0), out TemeState after);
            propagator.TryPropagate(minutes, out TemeState now);
            Vector3D slope = (after.PositionKm - before.PositionKm) * 0.5;
            Assert.True((slope - now.VelocityKmPerS).Norm < TenthOfAMetrePerSecondKmPerS);
        }
    }

    [Theory]
    [InlineData(0.0, 0.1, 50.0, "MeanMotionRevPerDay")]
    [InlineData(15.0, 1.0, 50.0, "Eccentricity")]
    [InlineData(15.0, 0.1, 181.0, "InclinationDeg")]
    [InlineData(double.NaN, 0.1, 50.0, "MeanMotionRevPerDay")]
    public void Elements_outside_their_ranges_are_refused_by_name(double meanMotion, double eccentricity, double inclination, string name)
    {
        ElementSet set = Sets[0] with { MeanMotionRevPerDay = meanMotion, Eccentricity = eccentricity, InclinationDeg = inclination };
        Assert.Equal(name, Assert.Throws<ArgumentOutOfRangeException>(() => new Sgp4Propagator(set)).ParamName);
    }

    [Fact]
    public void The_set_with_the_nearest_earlier_epoch_serves_and_before_the_first_the_first()
    {
        ElementSet second = Sets[2];
        UtcInstant epoch = second.EpochUtc;
        ElementSet first = second with { EpochUtc = epoch.AddSeconds(-86400), ElementSetNumber = 1 };
        ElementSet third = second with { EpochUtc = epoch.AddSeconds(86400), ElementSetNumber = 3 };
        var trajectory = new SpacecraftTrajectory([third, first, second], 0.0);
        Assert.Same(first, trajectory.ServingSet(epoch.AddSeconds(-1e6)));
        Assert.Same(first, trajectory.ServingSet(epoch.AddSeconds(-0.001)));
        Assert.Same(second, trajectory.ServingSet(epoch));
        Assert.Same(second, trajectory.ServingSet(epoch.AddSeconds(86399)));
        Assert.Same(third, trajectory.ServingSet(epoch.AddSeconds(1e6)));
        Assert.Throws<ArgumentException>(() => new SpacecraftTrajectory([], 0.0));
    }
}
