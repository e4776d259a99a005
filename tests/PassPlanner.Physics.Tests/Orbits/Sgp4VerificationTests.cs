using System.Globalization;
using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Orbits;
using PassPlanner.Tests;
using Xunit.Abstractions;

namespace PassPlanner.Physics.Tests.Orbits;

/// <summary>The published verification set of AIAA 2006-6753; see tests/reference/orbit/SOURCE.md.</summary>
public sealed class Sgp4VerificationTests(ITestOutputHelper output)
{
    private const double OneMillimetreKm = 1e-6;
    private const double OneMicrometrePerSecondKmPerS = 1e-9;

    private static readonly Dictionary<string, Sgp4Status> StatusOfPublishedCode = new()
    {
        ["1"] = Sgp4Status.MeanEccentricityOutOfRange,
        ["2"] = Sgp4Status.MeanMotionNotPositive,
        ["3"] = Sgp4Status.PerturbedEccentricityOutOfRange,
        ["4"] = Sgp4Status.SemiLatusRectumNegative,
        ["6"] = Sgp4Status.Decayed,
    };

    [Fact]
    public void Every_state_of_the_published_verification_set_is_reproduced()
    {
        IReadOnlyList<Sgp4Propagator> cases = [.. TestElementSets.Read("orbit/sgp4-verification.tle").Select(set => new Sgp4Propagator(set))];
        int states = 0;
        int errors = 0;
        double worstPosition = 0;
        double worstVelocity = 0;
        foreach (IReadOnlyDictionary<string, string> row in ReferenceData.Rows("orbit/sgp4-verification.csv"))
        {
            Sgp4Propagator propagator = cases[int.Parse(row["case"], CultureInfo.InvariantCulture) - 1];
            double minutes = Number(row["minutes_since_epoch_min"]);
            string where = $"case {row["case"]} ({row["catalog_number"]}) at {minutes} min";
            Sgp4Status status = propagator.TryPropagate(minutes, out TemeState state);
            if (row["error_code"] != "0")
            {
                Assert.True(status == StatusOfPublishedCode[row["error_code"]], $"{where}: {status}");
                Assert.Equal(default, state);
                errors++;
                continue;
            }

            Assert.True(status == Sgp4Status.Ok, $"{where}: {status}");
            double position = WorstComponent(state.PositionKm, Vector(row, "x_teme_km", "y_teme_km", "z_teme_km"));
            double velocity = WorstComponent(state.VelocityKmPerS, Vector(row, "vx_teme_km_s", "vy_teme_km_s", "vz_teme_km_s"));
            Assert.True(position <= OneMillimetreKm, $"{where}: position off by {position:g3} km");
            Assert.True(velocity <= OneMicrometrePerSecondKmPerS, $"{where}: velocity off by {velocity:g3} km/s");
            worstPosition = Math.Max(worstPosition, position);
            worstVelocity = Math.Max(worstVelocity, velocity);
            states++;
        }

        output.WriteLine($"sgp4-verification.csv: {states} states and {errors} error rows; worst {worstPosition:e2} km, {worstVelocity:e2} km/s");
        Assert.Equal(673, states + errors);
        Assert.Equal(7, errors);
    }

    private static double WorstComponent(Vector3D actual, Vector3D expected)
    {
        Vector3D difference = actual - expected;
        return Math.Max(Math.Abs(difference.X), Math.Max(Math.Abs(difference.Y), Math.Abs(difference.Z)));
    }

    private static Vector3D Vector(IReadOnlyDictionary<string, string> row, string x, string y, string z)
        => new(Number(row[x]), Number(row[y]), Number(row[z]));

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);
}
