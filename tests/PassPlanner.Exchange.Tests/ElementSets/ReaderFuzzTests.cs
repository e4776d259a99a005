using System.Text;
using CsCheck;
using PassPlanner.Exchange.ElementSets;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;
using PassPlanner.Tests;

namespace PassPlanner.Exchange.Tests.ElementSets;

/// <summary>Whatever is sent, a reader answers with sets within their ranges and refusals within the text.</summary>
public class ReaderFuzzTests
{
    private static readonly string[] Files =
    [
        "orbit/spacecraft.tle", "orbit/sgp4-verification.tle", "orbit/omm/ccsds-502-annex-g9.kvn", "orbit/omm/ccsds-502-annex-g10.xml",
        "orbit/omm/vanguard1.csv", "orbit/omm/vanguard1.json", "orbit/omm/vanguard1.xml",
    ];

    private const string Troublesome = "\n\r\t\0\"<{[=,\uFEFFé\uD800";

    private static readonly Gen<(int At, int Kind, char With)> Mutation = Gen.Select(
        Gen.Int[0, 20_000], Gen.Int[0, 3], Gen.OneOf(Gen.Char[' ', '~'], Gen.Int[0, Troublesome.Length - 1].Select(i => Troublesome[i])));

    [Theory]
    [InlineData(0)]
    [InlineData(1)]
    [InlineData(2)]
    [InlineData(3)]
    [InlineData(4)]
    [InlineData(5)]
    [InlineData(6)]
    public void A_spoiled_text_is_answered_in_order(int file)
    {
        string text = File.ReadAllText(ReferenceData.PathOf(Files[file]));
        Mutation.Array[1, 12].Sample(mutations => Check(mutations.Aggregate(text, Mutate)), iter: 300);
    }

    [Fact]
    public void Any_text_is_answered_in_order() => Gen.String.Sample(Check, iter: 300);

    private static string Mutate(string text, (int At, int Kind, char With) mutation)
    {
        int at = text.Length == 0 ? 0 : mutation.At % text.Length;
        return mutation.Kind switch
        {
            0 when text.Length > 0 => text.Remove(at, 1),
            1 => text.Insert(at, mutation.With.ToString()),
            2 => text[..at],
            _ when text.Length > 0 => text[..at] + mutation.With + text[(at + 1)..],
            _ => text,
        };
    }

    private static void Check(string text)
    {
        using var stream = new MemoryStream(Encoding.UTF8.GetBytes(text));
        ElementSetReading reading = ElementSetReader.Read(stream, new ElementSetReaderOptions { AcceptBadChecksums = true });
        int lines = 1 + text.Count(c => c is '\n' or '\r' or '\f' or '\u0085' or '\u2028' or '\u2029');
        Assert.All(reading.Refused, r => Assert.InRange(r.LineNumber, 1, lines));
        Assert.All(reading.Refused, r => Assert.True(r.Column >= 1 && r.Reason.Length > 0));
        Assert.All(reading.Accepted, r => CheckRanges(r.ElementSet));
    }

    private static void CheckRanges(ElementSet set)
    {
        Assert.InRange(set.CatalogNumber, 1, 999_999_999);
        Assert.InRange(set.Eccentricity, 0, Math.BitDecrement(1.0));
        Assert.InRange(set.InclinationDeg, 0, 180);
        Assert.InRange(set.MeanMotionRevPerDay, double.Epsilon, 20);
        Assert.InRange(set.RightAscensionOfNodeDeg, 0, Math.BitDecrement(360.0));
        Assert.InRange(set.ArgumentOfPerigeeDeg, 0, Math.BitDecrement(360.0));
        Assert.InRange(set.MeanAnomalyDeg, 0, Math.BitDecrement(360.0));
        Assert.True(set.EpochUtc >= UtcInstant.Earliest && set.EpochUtc < UtcInstant.Latest);
        Assert.True(double.IsFinite(set.BStarPerEarthRadius));
    }
}
