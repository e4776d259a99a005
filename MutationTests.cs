using System.Text;
using CsCheck;
using PassPlanner.Exchange.ElementSets;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;
using PassPlanner.Tests;
using Xunit.Abstractions;
using static PassPlanner.Exchange.Tests.ElementSets.Reading;

namespace PassPlanner.Exchange.Tests.ElementSets;

/// <summary>Files of tests/reference/orbit spoiled at random: nothing throws, and what is accepted is within the ranges.</summary>
public sealed class MutationTests(ITestOutputHelper output)
{
    private const int Spoilings = 3_000;

    private static readonly string[] Fragments =
        ["\r\n", "\n", "\r", "\"", ",", "=", "<", ">", "&", "{", "}", "[", "]", "\\u", "NaN", "1E999", "-", "\0", "é", "1 ", "2 ", "<omm>", "</omm>", "<![CDATA[", "CCSDS_OMM_VERS"];

    private static readonly Gen<(int Kind, double At, int Length, byte[] Bytes)> Spoiling = Gen.Select(
        Gen.Int[0, 3],
        Gen.Double[0, 1],
        Gen.Int[1, 40],
        Gen.OneOf(Gen.Byte.Array[1, 4], Gen.OneOfConst(Fragments).Select(Encoding.UTF8.GetBytes)));

    [Theory]
    [InlineData("spacecraft.tle", ElementSetFormat.TwoLine)]
    [InlineData("sgp4-verification.tle", ElementSetFormat.TwoLine)]
    [InlineData("omm/ccsds-502-annex-g9.kvn", ElementSetFormat.OmmKvn)]
    [InlineData("omm/ccsds-502-annex-g10.xml", ElementSetFormat.OmmXml)]
    [InlineData("omm/vanguard1.xml", ElementSetFormat.OmmXml)]
    [InlineData("omm/vanguard1.json", ElementSetFormat.OmmJson)]
    [InlineData("omm/vanguard1.csv", ElementSetFormat.OmmCsv)]
    public void A_spoiled_file_never_throws_and_gives_only_sets_within_the_ranges(string file, ElementSetFormat format)
    {
        byte[] content = File.ReadAllBytes(ReferenceData.PathOf("orbit/" + file));
        int accepted = 0;
        int refused = 0;
        Gen.Select(Spoiling.Array[1, 6], Gen.Bool, Gen.Bool).Sample(
            (spoilings, isGiven, acceptBadChecksums) =>
            {
                byte[] spoiled = spoilings.Aggregate(content, Spoil);
                ElementSetReading reading = Of(spoiled, isGiven ? format : null, acceptBadChecksums);
                int lineCount = LineCount(spoiled);
                Assert.All(reading.Refused, x => AssertIsPlaced(x, lineCount));
                Assert.All(reading.Accepted, x => AssertIsWithinRanges(x, lineCount));
                Interlocked.Add(ref accepted, reading.Accepted.Count);
                Interlocked.Add(ref refused, reading.Refused.Count);
            },
            iter: Spoilings);
        output.WriteLine($"{file}: {Spoilings} spoiled files, {accepted} sets accepted, {refused} refusals");
        Assert.True(accepted > 0 && refused > 0);
    }

    /// <summary>Cuts bytes out, puts bytes in, writes bytes over others, or repeats a piece.</summary>
    private static byte[] Spoil(byte[] content, (int Kind, double At, int Length, byte[] Bytes) spoiling)
    {
        int start = (int)(spoiling.At * content.Length);
        int end = Math.Min(start + spoiling.Length, content.Length);
        return spoiling.Kind switch
        {
            0 => [.. content[..start], .. content[end..]],
            1 => [.. content[..start], .. spoiling.Bytes, .. content[start..]],
            2 => [.. content[..start], .. spoiling.Bytes, .. content[Math.Min(start + spoiling.Bytes.Length, content.Length)..]],
            _ => [.. content[..end], .. content[start..]],
        };
    }

    private static int LineCount(byte[] content)
    {
        using var reader = new StringReader(Encoding.UTF8.GetString(content));
        int count = 0;
        while (reader.ReadLine() is not null)
        {
            count++;
        }

        return Math.Max(count, 1);
    }

    private static void AssertIsPlaced(RefusedLine refused, int lineCount)
    {
        Assert.InRange(refused.LineNumber, 1, lineCount);
        Assert.True(refused.Column >= 1);
        Assert.EndsWith(".", refused.Reason, StringComparison.Ordinal);
        Assert.DoesNotContain('\n', refused.Reason);
    }

    private static void AssertIsWithinRanges(ReadElementSet read, int lineCount)
    {
        ElementSet set = read.Elements;
        Assert.InRange(read.LineNumber, 1, lineCount);
        Assert.InRange(set.CatalogNumber, 1, 999_999_999);
        Assert.True(set.EpochUtc >= UtcInstant.Earliest && set.EpochUtc < UtcInstant.Latest);
        Assert.True(set.MeanMotionRevPerDay is > 0 and <= 20);
        Assert.True(set.Eccentricity is >= 0 and < 1);
        Assert.True(set.InclinationDeg is >= 0 and <= 180);
        Assert.All([set.RightAscensionOfNodeDeg, set.ArgumentOfPerigeeDeg, set.MeanAnomalyDeg], x => Assert.True(x is >= 0 and < 360));
        Assert.True(set.BStarPerEarthRadius is >= -100 and <= 100);
        Assert.True(set.MeanMotionDotRevPerDay2 is >= -10 and <= 10);
        Assert.True(set.MeanMotionDdotRevPerDay3 is >= -100 and <= 100);
        Assert.True(set.ElementSetNumber >= 0 && set.RevolutionNumber >= 0);
        Assert.True(set.Classification is 'U' or 'C' or 'S');
        Assert.True(set.Name.Length <= 100 && set.InternationalDesignator.Length <= 100);
    }
}
