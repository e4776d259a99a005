using System.Globalization;
using System.Text.RegularExpressions;
using CsCheck;
using PassPlanner.Physics.Links;
using PassPlanner.Physics.Noise;
using PassPlanner.Physics.Tests.Links;
using PassPlanner.Tests;
using Xunit.Abstractions;
using static PassPlanner.Physics.Tests.Links.WorstError;

namespace PassPlanner.Physics.Tests.Noise;

public partial class NoiseTests(ITestOutputHelper output)
{
    private const double PrintedToFourPlacesK = 0.00005;
    private const double PrintedToThreePlacesK = 0.0005;
    private const double PrintedToTwoPlacesK = 0.005;
    private const double PrintedToTwoFiguresK = 50;

    [Fact]
    public void Sky_noise_agrees_with_every_published_row()
    {
        var error = new WorstError(output, "radio/noise.csv, sky noise", "K");
        foreach (var row in Rows("sky noise"))
        {
            double[] inputs = Inputs(row["inputs"]);
            double temperatureK = SkyNoise.TemperatureK(inputs[0], SkyNoise.CosmicBackgroundK, inputs[1]);
            error.Check(Number(row["value"]), temperatureK, PrintedToFourPlacesK, row["inputs"]);
        }

        error.Report(8);
    }

    [Fact]
    public void Galactic_background_scales_from_the_measured_brightness()
    {
        Assert.Equal(Number(Rows("sky brightness, measured").Single()["value"]), SkyNoise.BackgroundK(408e6), 9);
        double scaledK = Number(Rows("sky brightness, scaled").Single()["value"]);
        Assert.InRange(SkyNoise.BackgroundK(437e6), scaledK - PrintedToTwoPlacesK, scaledK + PrintedToTwoPlacesK);
        Assert.InRange(SkyNoise.BackgroundK(8.2e9), 2.7, 2.71);
    }

    [Fact]
    public void Noise_figures_agree_with_every_published_row_and_back()
    {
        var error = new WorstError(output, "radio/noise.csv, noise figure", "K");
        foreach (var row in Rows("noise figure to temperature"))
        {
            double figureDb = Inputs(row["inputs"])[0];
            double temperatureK = NoiseFigure.ToTemperatureK(figureDb);
            error.Check(Number(row["value"]), temperatureK, PrintedToThreePlacesK, row["inputs"]);
            Assert.Equal(figureDb, NoiseFigure.FromTemperatureK(temperatureK), 9);
        }

        error.Report(3);
    }

    [Fact]
    public void System_temperatures_agree_with_every_published_row()
    {
        var error = new WorstError(output, "radio/noise.csv, system temperature", "K");
        foreach (var row in Rows("system temperature at receiver input"))
        {
            double[] inputs = Inputs(row["inputs"]);
            var chain = new ComponentNoise(receiverNoiseTemperatureK: inputs[3], lineTemperatureK: inputs[2]);
            error.Check(Number(row["value"]), chain.AtReceiverK(inputs[0], inputs[1]), PrintedToFourPlacesK, row["inputs"]);
        }

        var published = new ComponentNoise(NoiseFigure.ToTemperatureK(3.5));
        error.Report(4);
        var flange = new WorstError(output, "radio/noise.csv, system temperature as published to two figures", "K");
        flange.Check(3300, published.AtTerminalK(290, 7.1), PrintedToTwoFiguresK, "published at the antenna flange");
        Assert.Equal(290 * Math.Pow(10, 0.35) * Math.Pow(10, 0.71), published.AtTerminalK(290, 7.1), 9);
        flange.Report(1);
    }

    [Fact]
    public void Components_refer_to_the_antenna_terminal_as_the_definition_says() =>
        Gen.Select(Gen.Double[3, 290], Gen.Double[0, 5], Gen.Double[20, 500], Gen.Double[0, 30]).Sample((skyK, lossDb, receiverK, spilloverK) =>
        {
            double loss = Math.Pow(10, lossDb / 10);
            double expectedK = skyK + spilloverK + (285 * (loss - 1)) + (loss * receiverK);
            var chain = new ComponentNoise(receiverK, 285, spilloverK);
            Assert.InRange(chain.TemperatureK(40, skyK, lossDb) - expectedK, -1e-9, 1e-9);
            ReceivedNoise noise = chain.At(35, 40, skyK, lossDb);
            Assert.InRange(noise.GOverTDbPerK - (35 - (10 * Math.Log10(expectedK))), -1e-9, 1e-9);
        });

    [Fact]
    public void An_amplifier_of_much_gain_hides_the_noise_behind_it()
    {
        double behindK = NoiseCascade.TemperatureAtInputK([new NoiseStage(30, 50), new NoiseStage(-10, 2610), new NoiseStage(20, 600)]);
        Assert.Equal(50 + (2610.0 / 1000) + (600.0 / 100), behindK, 9);
    }

    [Fact]
    public void Entered_ratio_and_temperature_ignore_line_and_sky()
    {
        var ratio = new GOverTNoise(25);
        Assert.Equal(25, ratio.At(48, 48, 150, 2).GOverTDbPerK, 9);
        Assert.Equal(22, ratio.At(45, 48, 20, 0).GOverTDbPerK, 9);
        Assert.Equal(Math.Pow(10, 2.3), ratio.At(45, 48, 20, 0).SystemNoiseTemperatureK, 9);
        var temperature = new SystemTemperatureNoise(100);
        Assert.Equal(28, temperature.At(48, 48, 150, 2).GOverTDbPerK, 9);
        Assert.Equal(100, temperature.At(48, 48, 150, 2).SystemNoiseTemperatureK);
        Assert.False(ratio.FollowsSky || temperature.FollowsSky);
        Assert.True(new ComponentNoise(60).FollowsSky);
    }

    [Fact]
    public void Impossible_temperatures_are_refused_by_name()
    {
        Assert.Equal("systemNoiseTemperatureK", Assert.Throws<ArgumentOutOfRangeException>(() => new SystemTemperatureNoise(0)).ParamName);
        Assert.Equal("receiverNoiseTemperatureK", Assert.Throws<ArgumentOutOfRangeException>(() => new ComponentNoise(double.NaN)).ParamName);
        Assert.Equal("gOverTDbPerK", Assert.Throws<ArgumentOutOfRangeException>(() => new GOverTNoise(500)).ParamName);
        Assert.Equal("noiseFigureDb", Assert.Throws<ArgumentOutOfRangeException>(() => NoiseFigure.ToTemperatureK(-1)).ParamName);
    }

    private static IEnumerable<IReadOnlyDictionary<string, string>> Rows(string noiseCase) =>
        ReferenceData.Rows("radio/noise.csv").Where(row => row["case"] == noiseCase);

    private static double[] Inputs(string text) =>
        [.. Numbers().Matches(text).Select(match => double.Parse(match.Value, CultureInfo.InvariantCulture))];

    [GeneratedRegex(@"(?<=[= ])[0-9.]+")]
    private static partial Regex Numbers();
}
