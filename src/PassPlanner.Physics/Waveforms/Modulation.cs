namespace PassPlanner.Physics.Waveforms;

/// <summary>Uncoded modulations whose bit error rate theory gives.</summary>
public enum Modulation
{
    /// <summary>BPSK, QPSK, OQPSK and MSK, coherent.</summary>
    CoherentPsk,

    /// <summary>BPSK, differentially encoded and coherently detected.</summary>
    DifferentiallyEncodedBpsk,

    /// <summary>BPSK, differentially coherent.</summary>
    DifferentialBpsk,

    /// <summary>Binary FSK, orthogonal, coherent.</summary>
    CoherentFsk,

    /// <summary>Binary FSK, orthogonal, noncoherent.</summary>
    NoncoherentFsk,

    /// <summary>8PSK with Gray mapping, nearest-neighbour bound.</summary>
    EightPsk,

    /// <summary>16QAM with Gray mapping, nearest-neighbour bound.</summary>
    SixteenQam,
}
