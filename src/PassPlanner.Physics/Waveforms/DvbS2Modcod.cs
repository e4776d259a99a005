using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Waveforms;

/// <summary>A modulation and code of DVB-S2 with the normal frame of 64,800 bits (ETSI EN 302 307-1).</summary>
/// <param name="Modulation">Constellation.</param>
/// <param name="CodeRate">Nominal code rate.</param>
/// <param name="BitsPerSymbol">Coded bits per symbol.</param>
/// <param name="KbchBits">Information bits of a frame before the BCH code (Table 5a).</param>
/// <param name="EsN0Db">Ideal Es/N0, dB: no pilots, white noise, packet error rate 1e-7 (Table 13).</param>
public sealed record DvbS2Modcod(string Modulation, string CodeRate, int BitsPerSymbol, int KbchBits, double EsN0Db)
{
    private const int FrameBits = 64800;
    private const int BasebandHeaderBits = 80;
    private const int HeaderSymbols = 90;

    /// <summary>Information bits per symbol without pilots: (Kbch - 80) / (64800 / bits per symbol + 90).</summary>
    public double SpectralEfficiencyBitPerSymbol => (KbchBits - BasebandHeaderBits) / (((double)FrameBits / BitsPerSymbol) + HeaderSymbols);

    /// <summary>Eb/N0 per information bit, dB: Es/N0 less 10 log10 of the efficiency.</summary>
    public double EbN0Db => EsN0Db - Decibel.FromRatio(SpectralEfficiencyBitPerSymbol);
}
