using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Stations;

/// <summary>Radio climate of a station.</summary>
public sealed record ClimateDocument
{
    /// <summary>Rain rate exceeded for 0.01 % of an average year.</summary>
    [Quantity(0, 300, "mm/h")]
    public double? RainRate001MmPerH { get; init; }

    /// <summary>Mean rain height above sea level.</summary>
    [Quantity(0, 10, "km")]
    public double? RainHeightKm { get; init; }

    /// <summary>Mean surface temperature.</summary>
    [Quantity(180, 340, "K")]
    public double? SurfaceTemperatureK { get; init; }

    /// <summary>Mean surface pressure.</summary>
    [Quantity(300, 1100, "hPa")]
    public double? SurfacePressureHpa { get; init; }

    /// <summary>Mean surface water vapour density.</summary>
    [Quantity(0, 60, "g/m3")]
    public double? SurfaceVapourDensityGPerM3 { get; init; }

    /// <summary>Columnar water vapour.</summary>
    [Quantity(0, 120, "kg/m2")]
    public double? ColumnarVapourKgPerM2 { get; init; }

    /// <summary>Columnar cloud liquid water.</summary>
    [Quantity(0, 20, "kg/m2")]
    public double? ColumnarCloudLiquidKgPerM2 { get; init; }

    /// <summary>Wet term of the surface refractivity.</summary>
    [Quantity(0, 300, "N-units")]
    public double? WetRefractivityNUnits { get; init; }
}
