namespace PassPlanner.Exchange.ElementSets;

/// <summary>Finds line and column of a byte of a text.</summary>
internal sealed class LineIndex
{
    private readonly List<int> starts = [0];

    public LineIndex(ReadOnlySpan<byte> text)
    {
        for (int i = 0; i < text.Length; i++)
        {
            if (text[i] == (byte)'\n')
            {
                starts.Add(i + 1);
            }
        }
    }

    public Place PlaceOf(long index)
    {
        int line = starts.BinarySearch((int)index);
        line = line < 0 ? ~line - 1 : line;
        return new Place(line + 1, (int)index - starts[line] + 1);
    }
}
