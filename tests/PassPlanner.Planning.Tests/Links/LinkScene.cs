using PassPlanner.Physics.Antennas;
using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Links;
using PassPlanner.Physics.Noise;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Pointing;
using PassPlanner.Physics.Time;
using PassPlanner.Physics.Waveforms;
using PassPlanner.Planning.Links;
using PassPlanner.Planning.Passes;
using PassPlanner.Planning.Profiles;
using PassPlanner.Tests;

namespace PassPlanner.Planning.Tests.Links;

/// <summary>Profiles that tests vary, and one real pass to run them along: 46313 over WIRR (tests/reference/orbit).</summary>
internal static class LinkScene
{
    public static readonly GeodeticPosition Place = new(-33.9, 138.2, 120);

    public static readonly Transmitter Transmitter = new()
    {
        Id = "x-tx",
        FrequencyHz = 8.2e9,
        RequiredMarginDb = 3,
        MinimumElevationDeg = 10,
        AcquisitionS = 10,
        Pattern = new GaussianBeamModel(6, 90),
        Mounting = new AntennaMounting(new Vector3D(0, 0, 1)),
        Polarisation = Polarisation.RightCircular(2),
        PolarisationCase = PolarisationCase.Worst,
        Waveforms = [new Waveform("QPSK 1/2", 25e6, 1.05, 1.5), new Waveform("8PSK 2/3", 50e6, 3.65, 1.8, 0.9)],
        PowerW = 2,
        LineLossDb = 0.8,
    };

    public static readonly Receiver Receiver = new()
    {
        Id = "s-rx",
        FrequencyHz = 2.05e9,
        RequiredMarginDb = 3,
        MinimumElevationDeg = 10,
        AcquisitionS = 0,
        Pattern = new HalfWaveDipoleModel(),
        Mounting = new AntennaMounting(new Vector3D(0, 0, 1)),
        Polarisation = Polarisation.RightCircular(3),
        PolarisationCase = PolarisationCase.Worst,
        Waveforms = [new Waveform("BPSK", 4000, 9.6, 2)],
        GOverTDbPerK = -28,
    };

    public static readonly ReceiveChain Receive = new()
    {
        Id = "x-rx",
        FromHz = 8.0e9,
        ToHz = 8.4e9,
        Pattern = new TaperedApertureModel(3.7, 11, efficiency: 0.62),
        Polarisation = Polarisation.RightCircular(1),
        LineLossDb = 0.3,
        Noise = new ComponentNoise(60, 290, 12),
        ClearSkyZenithLossDb = 0.1,
    };

    public static readonly TransmitChain Transmit = new()
    {
        Id = "s-tx",
        FromHz = 2.025e9,
        ToHz = 2.11e9,
        Pattern = new GaussianBeamModel(34, 2.8),
        Polarisation = Polarisation.RightCircular(1),
        LineLossDb = 1,
        PowerW = 20,
        ClearSkyZenithLossDb = 0.05,
    };

    public static readonly Antenna Antenna = new()
    {
        Id = "dish",
        Name = "3.7 m dish",
        SetUpS = 0,
        TearDownS = 0,
        Pointing = new PointingErrors(0.05, 0.03, 1),
        Receive = [Receive],
        Transmit = [Transmit],
    };

    public static readonly SpacecraftTrajectory Trajectory = new([ElementSetOf(46313)], 0);

    private static readonly TopocentricFrame Frame = new(Place);

    /// <summary>The seconds of the pass that is highest on 23 January 2022, 38 degrees.</summary>
    public static PassTrack Track()
    {
        var period = new TimeWindow(UtcInstant.FromCalendar(2022, 1, 23, 12), UtcInstant.FromCalendar(2022, 1, 23, 14));
        Pass pass = Assert.Single(PassFinder.Find(Trajectory, Frame, HorizonMask.Default, period, CancellationToken.None).Passes);
        UtcInstant first = pass.Window.StartUtc.CeilingToSecond();
        int seconds = (int)Math.Ceiling(pass.Window.EndUtc.SecondsSince(first));
        var track = new PassTrack(seconds);
        track.Fill(Trajectory, Frame, first, 1, seconds);
        return track;
    }

    public static LinkChain Downlink(Transmitter? radio = null, ReceiveChain? chain = null, Antenna? antenna = null, AttitudeLaw? attitude = null) =>
        new(new Link(LinkDirection.Downlink, antenna ?? Antenna, radio ?? Transmitter, chain ?? Receive), attitude ?? new NadirAttitude(), new GainTables());

    public static LinkChain Uplink(Receiver? radio = null, TransmitChain? chain = null) =>
        new(new Link(LinkDirection.Uplink, Antenna, radio ?? Receiver, chain ?? Transmit), new NadirAttitude(), new GainTables());

    public static LinkSample[] Samples(LinkChain chain, PassTrack track)
    {
        var columns = new LinkColumns(track.Count);
        chain.Evaluate(track, columns);
        return columns.Samples.ToArray();
    }

    private static ElementSet ElementSetOf(int catalogNumber) =>
        TestElementSets.Read("orbit/spacecraft.tle").First(s => s.CatalogNumber == catalogNumber);
}
