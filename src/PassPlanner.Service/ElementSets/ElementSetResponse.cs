namespace PassPlanner.Service.ElementSets;

/// <summary>An element set of a spacecraft.</summary>
public sealed record ElementSetResponse
{
    /// <summary>Epoch.</summary>
    public required string EpochUtc { get; init; }

    /// <summary>Age now, hours; negative for an epoch to come.</summary>
    public required double AgeH { get; init; }

    /// <summary>Age past which a result is marked, hours.</summary>
    public required double LimitH { get; init; }

    /// <summary>Catalogue number.</summary>
    public required int CatalogNumber { get; init; }

    /// <summary>Name in the source.</summary>
    public required string Name { get; init; }

    /// <summary>Mean motion, revolutions a day.</summary>
    public required double MeanMotionRevPerDay { get; init; }

    /// <summary>Eccentricity.</summary>
    public required double Eccentricity { get; init; }

    /// <summary>Inclination, degrees.</summary>
    public required double InclinationDeg { get; init; }

    /// <summary>Right ascension of the node, degrees.</summary>
    public required double RightAscensionOfNodeDeg { get; init; }

    /// <summary>Argument of perigee, degrees.</summary>
    public required double ArgumentOfPerigeeDeg { get; init; }

    /// <summary>Mean anomaly, degrees.</summary>
    public required double MeanAnomalyDeg { get; init; }

    /// <summary>Drag term B*, per Earth radius.</summary>
    public required double BStarPerEarthRadius { get; init; }

    /// <summary>Where it came from.</summary>
    public required string Source { get; init; }

    /// <summary>When it came.</summary>
    public required string ReceivedUtc { get; init; }

    /// <summary>Whether it serves now.</summary>
    public required bool IsServing { get; init; }
}
