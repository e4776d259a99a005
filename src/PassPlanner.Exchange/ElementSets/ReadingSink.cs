using PassPlanner.Physics.Orbits;

namespace PassPlanner.Exchange.ElementSets;

/// <summary>Takes what the readers find.</summary>
internal sealed class ReadingSink
{
    private readonly List<ReadElementSet> accepted = [];
    private readonly List<RefusedLine> refused = [];

    public void Accept(ElementSet elementSet, int lineNumber) => accepted.Add(new ReadElementSet(elementSet, lineNumber));

    public void Refuse(int lineNumber, int column, string reason) => refused.Add(new RefusedLine(lineNumber, column, reason));

    public void Refuse(RefusedLine line) => refused.Add(line);

    public ElementSetReading ToReading(ElementSetFormat format) => new(accepted, [.. refused.OrderBy(r => r.LineNumber)], format);
}
