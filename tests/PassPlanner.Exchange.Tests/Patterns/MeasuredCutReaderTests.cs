using System.Text;
using CsCheck;
using PassPlanner.Exchange.Patterns;
using PassPlanner.Physics.Antennas;

namespace PassPlanner.Exchange.Tests.Patterns;

public class MeasuredCutReaderTests
{
    [Fact]
    public void One_cut_is_read_in_the_order_of_its_angles()
    {
        MeasuredCut cut = Assert.Single(Read("angleDeg,gainDbi\n0,12.5\n90,-20\n30,3\n").Cuts);
        Assert.Equal(0, cut.PhiDeg);
        Assert.Equal([0, 30, 90], cut.AngleDeg);
        Assert.Equal([12.5, 3, -20], cut.GainDbi);
    }

    [Fact]
    public void Several_cuts_come_in_any_order_of_columns_and_rows()
    {
        MeasuredCutReading reading = Read("gainDbi, phiDeg, angleDeg\r\n1,90,0\r\n2,0,0\r\n3,90,45\r\n4,0,45\r\n");
        Assert.Equal([0.0, 90.0], reading.Cuts.Select(c => c.PhiDeg));
        Assert.Equal([2, 4], reading.Cuts[0].GainDbi);
    }

    [Theory]
    [InlineData("", 1, 1, "no row with a point")]
    [InlineData("angle,gain\n0,1\n", 1, 1, "\"angle\" is no column here")]
    [InlineData("angleDeg,phiDeg\n0,1\n", 1, 1, "must name angleDeg and gainDbi")]
    [InlineData("angleDeg,gainDbi\n0,1\n181,2\n", 3, 1, "angleDeg is \"181\"; it must be a number from 0 to 180 degrees")]
    [InlineData("angleDeg,gainDbi\n0,1\n10,NaN\n", 3, 2, "gainDbi is \"NaN\"; it must be a number from -100 to 100 dBi")]
    [InlineData("angleDeg,gainDbi\n0,1\n10\n", 3, 2, "gainDbi is \"\"")]
    [InlineData("angleDeg,gainDbi\n0,1\n", 1, 1, "has one point; it must have at least 2")]
    [InlineData("angleDeg,gainDbi\n0,1\n0,2\n", 1, 1, "has angleDeg 0 twice")]
    public void What_cannot_be_a_pattern_is_refused_with_its_place(string text, int row, int field, string reason)
    {
        MeasuredCutReading reading = Read(text);
        Assert.Empty(reading.Cuts);
        Assert.Equal((row, field), (reading.Refused[0].Row, reading.Refused[0].Field));
        Assert.Contains(reason, reading.Refused[0].Reason, StringComparison.Ordinal);
    }

    [Fact]
    public void Any_text_is_answered_with_cuts_or_with_refusals() => Gen.String[Gen.OneOf(Gen.Char[' ', '~'], Gen.Int[0, 3].Select(i => "\n,\"0"[i])), 0, 200].Sample(tail =>
    {
        MeasuredCutReading reading = Read("angleDeg,gainDbi\n0,1\n5,2\n" + tail);
        Assert.True(reading.Cuts.Count > 0 ^ reading.Refused.Count > 0);
    });

    private static MeasuredCutReading Read(string text)
    {
        using var stream = new MemoryStream(Encoding.UTF8.GetBytes(text));
        return MeasuredCutReader.Read(stream);
    }
}
