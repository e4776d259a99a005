using System.Globalization;
using Xunit.Abstractions;

namespace PassPlanner.Physics.Tests.Links;

/// <summary>Keeps the worst difference from outside values, and says how many were checked.</summary>
internal sealed class WorstError(ITestOutputHelper output, string file, string unit)
{
    private int rows;
    private double worst;

    public void Check(double expected, double actual, double tolerance, string row)
    {
        rows++;
        double error = Math.Abs(actual - expected);
        worst = Math.Max(worst, error);
        Assert.True(error <= tolerance, string.Create(
            CultureInfo.InvariantCulture, $"{file}, {row}: expected {expected} {unit}, found {actual}, off by {error}; tolerance {tolerance}"));
    }

    public void Report(int rowsExpected)
    {
        output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{file}: {rows} values checked, worst error {worst:G3} {unit}"));
        Assert.Equal(rowsExpected, rows);
    }

    public static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);
}
