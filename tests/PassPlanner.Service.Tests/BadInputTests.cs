using System.Net;
using System.Text.Json.Nodes;

namespace PassPlanner.Service.Tests;

/// <summary>Bad input is answered with a problem that names the member, the value, the unit and the range, and changes nothing.</summary>
public class BadInputTests
{
    public static TheoryData<string, string?, string, string> BadStations => new()
    {
        { "/colour", "\"red\"", "#/colour", "\"colour\" is not a member of the body" },
        { "/name", null, "#/name", "name is missing" },
        { "/name", "\"  \"", "#/name", "name is blank; it must have 1 to 120 characters" },
        { "/name", "\"a\\u202eb\"", "#/name", "turns the direction of writing" },
        { "/name", "\"a\\u0007b\"", "#/name", "name has a control character" },
        { "/name", "7", "#/name", "name is 7; it must be a text" },
        { "/position", null, "#/position", "position is missing" },
        { "/position/latitudeDeg", null, "#/position/latitudeDeg", "latitudeDeg is missing; it must be from -90 to 90 degrees" },
        { "/position/latitudeDeg", "\"north\"", "#/position/latitudeDeg", "latitudeDeg is \"north\"; it must be a number, from -90 to 90 degrees" },
        { "/position/latitudeDeg", "91", "#/position/latitudeDeg", "latitudeDeg is 91; it must be from -90 to 90 degrees" },
        { "/position/latitudeDeg", "1e999", "#/position/latitudeDeg", "it must be from -90 to 90 degrees" },
        { "/position/latitudeDeg", "null", "#/position/latitudeDeg", "latitudeDeg is null" },
        { "/horizonMask", "[]", "#/horizonMask", "horizonMask has 0 entries; it must have 1 to 720" },
        { "/horizonMask", """[{ "azimuthDeg": 10, "elevationDeg": 5 }, { "azimuthDeg": 10, "elevationDeg": 6 }]""", "#/horizonMask/1/azimuthDeg", "azimuthDeg is 10 degrees twice" },
        { "/horizonMask/0/azimuthDeg", "360", "#/horizonMask/0/azimuthDeg", "azimuthDeg is 360; it must be at least 0 and below 360 degrees" },
        { "/antennas/0/receive/0/fromHz", "0", "#/antennas/0/receive/0/fromHz", "fromHz is 0; it must be from 30000000 to 300000000000 Hz" },
        { "/antennas/0/receive/0/toHz", "8e9", "#/antennas/0/receive/0/toHz", "toHz is 8000000000; it must be at least fromHz" },
        { "/antennas/0/receive/0/pattern/diameterM", "0", "#/antennas/0/receive/0/pattern/diameterM", "diameterM is 0; it must be above 0 and at most 100 m" },
        { "/antennas/0/receive/0/pattern/kind", "\"horn\"", "#/antennas/0/receive/0/pattern/kind", "kind is \"horn\"; it must be one of isotropic" },
        { "/antennas/0/receive/0/pattern/gainDbi", "30", "#/antennas/0/receive/0/pattern/gainDbi", "gainDbi does not belong to the kind taperedAperture" },
        { "/antennas/0/receive/0/pattern/efficiency", "0.999", "#/antennas/0/receive/0/pattern/efficiency", "efficiency is 0.999" },
        { "/antennas/0/receive/0/noise", """{ "kind": "gOverT" }""", "#/antennas/0/receive/0/noise/gOverTDbPerK", "gOverTDbPerK is missing; the kind gOverT needs it" },
        { "/antennas/0/mount/azimuth/maximumDeg", "-300", "#/antennas/0/mount/azimuth/maximumDeg", "maximumDeg is -300; it must be above minimumDeg" },
        { "/antennas/0/pointing/jitterRmsDeg", "-1", "#/antennas/0/pointing/jitterRmsDeg", "jitterRmsDeg is -1; it must be from 0 to 11 degrees" },
        { "/id", "\"Bad Id\"", "#/id", "id is \"Bad Id\"; it must have 1 to 64 of a-z, 0-9 and hyphen" },
    };

    public static TheoryData<string, string?, string, string> BadSpacecraft => new()
    {
        { "/transmitters/0/frequencyHz", "0", "#/transmitters/0/frequencyHz", "frequencyHz is 0; it must be from 30000000 to 300000000000 Hz" },
        { "/transmitters/0/powerW", "-2", "#/transmitters/0/powerW", "powerW is -2; it must be above 0 and at most 100000 W" },
        { "/transmitters/0/pattern/cuts/0", """{ "angleDeg": [0], "gainDbi": [4] }""", "#/transmitters/0/pattern/cuts/0/angleDeg", "at least 2 points" },
        { "/transmitters/0/pattern/cuts/0", """{ "angleDeg": [0, 30], "gainDbi": [4] }""", "#/transmitters/0/pattern/cuts/0/gainDbi", "one for each of the 2 angles" },
        { "/transmitters/0/pattern/cuts/0", """{ "angleDeg": [30, 0], "gainDbi": [4, 5] }""", "#/transmitters/0/pattern/cuts/0/angleDeg", "strictly increasing" },
        { "/transmitters/0/waveforms", "[]", "#/transmitters/0/waveforms", "waveforms has 0 entries" },
        { "/transmitters/0/boresight", "[0, 0, 0]", "#/transmitters/0/boresight", "finite vector longer than 0" },
        { "/transmitters/0/boresight", "[0, 1]", "#/transmitters/0/boresight", "boresight has 2 numbers; it must have 3" },
        { "/attitude", """{ "kind": "inertial" }""", "#/attitude/quaternion", "quaternion is missing; the kind inertial needs it" },
        { "/attitude", """{ "kind": "uncontrolled", "percentile": 100 }""", "#/attitude/percentile", "percentile is 100; it must be above 0 and below 100 percent" },
        { "/catalogNumber", "1234567890", "#/catalogNumber", "catalogNumber is 1234567890; it must be" },
        { "/catalogNumber", "1.5", "#/catalogNumber", "catalogNumber is 1.5; it must be a whole number" },
        { "/needs/0/hours", "5", "#/needs/0/hours", "hours does not belong to the kind contactsPerDay" },
        { "/recorder/storedBytes", "65e9", "#/recorder/storedBytes", "it must be at most capacityBytes" },
    };

    [Theory]
    [MemberData(nameof(BadStations))]
    public Task A_bad_station_is_refused(string pointer, string? json, string errorPointer, string detail) =>
        RefusedAsync("/api/v1/stations", Samples.With(Samples.Station, pointer, json), errorPointer, detail);

    [Theory]
    [MemberData(nameof(BadSpacecraft))]
    public Task A_bad_spacecraft_is_refused(string pointer, string? json, string errorPointer, string detail) =>
        RefusedAsync("/api/v1/spacecraft", Samples.With(Samples.Spacecraft, pointer, json), errorPointer, detail);

    [Theory]
    [InlineData("NaN")]
    [InlineData("Infinity")]
    [InlineData("-Infinity")]
    public Task A_number_that_JSON_does_not_know_is_refused_at_its_member(string number) => RefusedAsync(
        "/api/v1/stations",
        Samples.Spoiled(Samples.Station, "\"latitudeDeg\": -33.9", $"\"latitudeDeg\": {number}"),
        "#/position/latitudeDeg",
        $"latitudeDeg is \"{number}\"; it must be a number, from -90 to 90 degrees");

    [Theory]
    [InlineData("", "The body is empty")]
    [InlineData("{", "The body is not JSON at line 1")]
    [InlineData("[]", "the body is a list; it must be an object")]
    [InlineData("""{ "name": "A", "name": "B" }""", "The body is not JSON")]
    public async Task A_body_that_is_no_document_is_refused(string body, string detail)
    {
        using var host = new ServiceHost();
        using HttpResponseMessage response = await host.SendAsync(HttpMethod.Post, "/api/v1/stations", body);
        Assert.Equal(HttpStatusCode.BadRequest, response.StatusCode);
        Assert.Contains(detail, (await ServiceHost.ProblemAsync(response))["detail"]!.GetValue<string>(), StringComparison.Ordinal);
    }

    [Fact]
    public async Task All_errors_of_a_document_come_in_one_answer()
    {
        using var host = new ServiceHost();
        string body = Samples.With(Samples.With(Samples.Station, "/position/latitudeDeg", "91"), "/position/heightM", "99999");
        using HttpResponseMessage response = await host.SendAsync(HttpMethod.Post, "/api/v1/stations", body);
        Assert.Equal(2, (await ServiceHost.ProblemAsync(response))["errors"]!.AsArray().Count);
    }

    [Theory]
    [InlineData("fromUtc=2022-01-23T00:00:00Z&toUtc=2032-01-23T00:00:00Z", "#/toUtc", "at most 31 days after fromUtc")]
    [InlineData("fromUtc=1956-12-31T23:59:59Z", "#/fromUtc", "it must be from 1957-01-01T00:00:00Z")]
    [InlineData("fromUtc=yesterday", "#/fromUtc", "it must be an ISO 8601 UTC instant")]
    [InlineData("fromUtc=2022-01-23T00:00:00", "#/fromUtc", "it must be an ISO 8601 UTC instant")]
    [InlineData("fromUtc=2022-01-24T00:00:00Z&toUtc=2022-01-23T00:00:00Z", "#/toUtc", "it must be later than fromUtc")]
    [InlineData("minimumMarginDb=lots", "#/minimumMarginDb", "it must be a number from -200 to 200 dB")]
    [InlineData("minimumMarginDb=NaN", "#/minimumMarginDb", "it must be a number from -200 to 200 dB")]
    [InlineData("verdict=maybe", "#/verdict", "it must be one of closes, closesInPart, doesNotClose")]
    [InlineData("closes=1", "#/closes", "it must be one of true, false")]
    [InlineData("limit=0", "#/limit", "it must be a number from 1 to 1000")]
    [InlineData("station=nowhere", "#/station", "there is no such station")]
    [InlineData("colour=red", "#/colour", "is not a parameter here")]
    public async Task A_bad_query_for_passes_is_refused(string query, string pointer, string detail)
    {
        using var host = new ServiceHost();
        using HttpResponseMessage response = await host.SendAsync(HttpMethod.Get, "/api/v1/passes?" + query);
        Assert.Equal(HttpStatusCode.BadRequest, response.StatusCode);
        JsonNode error = (await ServiceHost.ProblemAsync(response))["errors"]![0]!;
        Assert.Equal(pointer, error["pointer"]!.GetValue<string>());
        Assert.Contains(detail, error["detail"]!.GetValue<string>(), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("/api/v1/nothing")]
    [InlineData("/api/v1/stations/nothing")]
    [InlineData("/api/v1/spacecraft/nothing/element-sets")]
    [InlineData("/api/v1/passes/a/b/2022-01-23T00:00:00Z")]
    [InlineData("/nothing.png")]
    public async Task What_does_not_exist_is_answered_with_a_problem(string url)
    {
        using var host = new ServiceHost();
        using HttpResponseMessage response = await host.SendAsync(HttpMethod.Get, url);
        Assert.Equal(HttpStatusCode.NotFound, response.StatusCode);
        await ServiceHost.ProblemAsync(response);
    }

    [Fact]
    public async Task A_method_that_an_address_does_not_take_is_answered_with_a_problem()
    {
        using var host = new ServiceHost();
        using HttpResponseMessage response = await host.SendAsync(HttpMethod.Patch, "/api/v1/stations");
        Assert.Equal(HttpStatusCode.MethodNotAllowed, response.StatusCode);
        await ServiceHost.ProblemAsync(response);
    }

    private static async Task RefusedAsync(string url, string body, string pointer, string detail)
    {
        using var host = new ServiceHost();
        using HttpResponseMessage response = await host.SendAsync(HttpMethod.Post, url, body);
        Assert.Equal(HttpStatusCode.BadRequest, response.StatusCode);
        JsonNode problem = await ServiceHost.ProblemAsync(response);
        Assert.Equal("urn:pass-planner:problem:invalid-input", problem["type"]!.GetValue<string>());
        JsonNode error = Assert.Single(problem["errors"]!.AsArray())!;
        Assert.Equal(pointer, error["pointer"]!.GetValue<string>());
        Assert.Contains(detail, error["detail"]!.GetValue<string>(), StringComparison.Ordinal);
        Assert.Empty((await host.GetAsync(url))["items"]!.AsArray());
    }
}
