using PassPlanner.Physics.Time;

namespace PassPlanner.Physics.Orbits;

/// <summary>
/// General-perturbations mean elements of one object at one epoch, as SGP4 takes them (CCSDS 502.0-B, mean
/// element theory SGP4, frame TEME, time system UTC).
/// </summary>
public sealed record ElementSet
{
    /// <summary>Catalogue number, 1 to 999,999,999.</summary>
    public required int CatalogNumber { get; init; }

    /// <summary>Object name as the source gives it; empty when it gives none.</summary>
    public string Name { get; init; } = "";

    /// <summary>International designator such as 1998-067A; empty when blank in the source.</summary>
    public string InternationalDesignator { get; init; } = "";

    /// <summary>Epoch of the elements.</summary>
    public required UtcInstant EpochUtc { get; init; }

    /// <summary>Kozai mean motion, revolutions per day, above 0.</summary>
    public required double MeanMotionRevPerDay { get; init; }

    /// <summary>Eccentricity, 0 to below 1.</summary>
    public required double Eccentricity { get; init; }

    /// <summary>Inclination, degrees, 0 to 180.</summary>
    public required double InclinationDeg { get; init; }

    /// <summary>Right ascension of the ascending node, degrees.</summary>
    public required double RightAscensionOfNodeDeg { get; init; }

    /// <summary>Argument of perigee, degrees.</summary>
    public required double ArgumentOfPerigeeDeg { get; init; }

    /// <summary>Mean anomaly, degrees.</summary>
    public required double MeanAnomalyDeg { get; init; }

    /// <summary>Drag term B*, per Earth radius.</summary>
    public double BStarPerEarthRadius { get; init; }

    /// <summary>Half the first derivative of mean motion as element sets print it, rev/day^2; SGP4 does not use it.</summary>
    public double MeanMotionDotRevPerDay2 { get; init; }

    /// <summary>A sixth of the second derivative of mean motion as element sets print it, rev/day^3; SGP4 does not use it.</summary>
    public double MeanMotionDdotRevPerDay3 { get; init; }

    /// <summary>Element set number; 0 when the source gives none.</summary>
    public int ElementSetNumber { get; init; }

    /// <summary>Revolution number at epoch; 0 when the source gives none.</summary>
    public int RevolutionNumber { get; init; }

    /// <summary>Classification: U, C or S.</summary>
    public char Classification { get; init; } = 'U';
}
