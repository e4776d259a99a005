namespace PassPlanner.Physics.Waveforms;

/// <summary>The library of published waveforms. Thresholds are ideal: an implementation loss is on top.</summary>
public static class PublishedWaveforms
{
    private const string DvbSource = "ETSI EN 302 307-1 Table 13, normal frame, no pilots, ideal Es/N0; efficiency (Kbch - 80)/(64800/bits + 90)";
    private const string TheorySource = "textbook formula in white Gaussian noise (Proakis, Digital Communications)";
    private const string ReedSolomonSource = "computed: bounded-distance decoding on BPSK in white noise, hard decisions (method of CCSDS 130.1-G)";
    private const string ConvolutionalSource =
        "computed: union bound with the distance spectrum of the code, unquantised (CCSDS 130.1-G-3 reads a gain of about 5.5 dB at BER 1e-5, which agrees)";

    /// <summary>The DVB-S2 modulations and codes whose thresholds are carried, by growing efficiency within each constellation.</summary>
    public static IReadOnlyList<DvbS2Modcod> DvbS2 { get; } =
    [
        new("QPSK", "1/4", 2, 16008, -2.35),
        new("QPSK", "2/5", 2, 25728, -0.30),
        new("QPSK", "3/5", 2, 38688, 2.23),
        new("QPSK", "3/4", 2, 48408, 4.03),
        new("QPSK", "5/6", 2, 53840, 5.18),
        new("QPSK", "9/10", 2, 58192, 6.42),
        new("8PSK", "2/3", 3, 43040, 6.62),
        new("8PSK", "5/6", 3, 53840, 9.35),
        new("8PSK", "9/10", 3, 58192, 10.98),
        new("16APSK", "3/4", 4, 48408, 10.21),
        new("16APSK", "5/6", 4, 53840, 11.61),
        new("16APSK", "9/10", 4, 58192, 13.13),
        new("32APSK", "4/5", 5, 51648, 13.64),
        new("32APSK", "8/9", 5, 57472, 15.69),
    ];

    /// <summary>All entries: uncoded by theory, the codes of CCSDS 131.0-B, DVB-S2.</summary>
    public static IReadOnlyList<PublishedWaveform> All { get; } = [.. Uncoded(), .. Ccsds(), .. DvbS2.Select(Entry)];

    private static IEnumerable<PublishedWaveform> Uncoded()
    {
        (Modulation Modulation, string Name, double? BitPerSymbol)[] uncoded =
        [
            (Modulation.CoherentPsk, "uncoded BPSK", 1),
            (Modulation.CoherentPsk, "uncoded QPSK or OQPSK", 2),
            (Modulation.CoherentPsk, "uncoded MSK", 1),
            (Modulation.DifferentiallyEncodedBpsk, "uncoded BPSK, differentially encoded", 1),
            (Modulation.DifferentialBpsk, "uncoded DBPSK", 1),
            (Modulation.CoherentFsk, "uncoded FSK, coherent", 1),
            (Modulation.NoncoherentFsk, "uncoded FSK, noncoherent", 1),
            (Modulation.EightPsk, "uncoded 8PSK", 3),
            (Modulation.SixteenQam, "uncoded 16QAM", 4),
        ];
        foreach ((Modulation modulation, string name, double? bitPerSymbol) in uncoded)
        {
            yield return new PublishedWaveform(
                name, BitErrorRate.RequiredEbN0Db(modulation, 1e-5), "BER 1e-5", bitPerSymbol, IsFromMemory: false, TheorySource);
        }
    }

    private static PublishedWaveform[] Ccsds() =>
    [
        new("BPSK, RS(255,223)", 6.38, "BER 1e-6", 223.0 / 255, false, ReedSolomonSource),
        new("BPSK, RS(255,239)", 6.80, "BER 1e-5", 239.0 / 255, false, ReedSolomonSource),
        new("BPSK, convolutional (7,1/2)", 4.79, "BER 1e-6", 0.5, false, ConvolutionalSource),
        new("BPSK, convolutional (7,1/2) + RS(255,223), depth 5", 2.6, "BER 1e-6", 223.0 / 510, true, "from memory: CCSDS 130.1-G, concatenated code, read as 2.4 to 2.7 dB"),
        new("BPSK, turbo 1/2, 8920 bits", 1.0, "FER 1e-4", 0.5, true, "from memory: CCSDS 130.1-G, turbo codes, about 1.0 dB"),
        new("BPSK, turbo 1/6, 8920 bits", -0.1, "FER 1e-4", 1.0 / 6, true, "from memory: CCSDS 130.1-G, turbo codes, about -0.1 dB"),
        new("BPSK, LDPC 1/2, 1024 bits", 1.9, "WER 1e-4", 0.5, true, "from memory: CCSDS 130.1-G, LDPC codes, 1.8 to 2.0 dB"),
        new("BPSK, LDPC (8160,7136)", 4.0, "BER 1e-6", 7136.0 / 8160, true, "from memory: CCSDS 130.1-G, LDPC codes, 3.9 to 4.1 dB"),
    ];

    private static PublishedWaveform Entry(DvbS2Modcod modcod) => new(
        $"DVB-S2 {modcod.Modulation} {modcod.CodeRate}",
        modcod.EbN0Db,
        "PER 1e-7",
        modcod.SpectralEfficiencyBitPerSymbol,
        IsFromMemory: false,
        DvbSource);
}
