using PassPlanner.Physics.Time;

namespace PassPlanner.Physics.Orbits;

/// <summary>
/// What SDP4 adds for periods of 225 minutes and more: the Moon and the Sun, and the resonance of half-day and one-day
/// orbits with the Earth's gravity (section 6 of Spacetrack Report #3; AIAA 2006-6753, appendix A, improved mode).
/// Immutable: the resonance is integrated from the epoch in every call.
/// </summary>
internal sealed class DeepSpaceTerms
{
    private const double SmallInclinationRad = 5.2359877e-2;
    private const double LyddaneInclinationRad = 0.2;

    private readonly ThirdBodyTerms sun;
    private readonly ThirdBodyTerms moon;
    private readonly Resonance? resonance;
    private readonly double eccentricityRate;
    private readonly double inclinationRate;
    private readonly double anomalyRate;
    private readonly double perigeeRate;
    private readonly double nodeRate;

    /// <summary>Works out the terms at the epoch.</summary>
    /// <param name="gravity">Gravity constants.</param>
    /// <param name="epochUtc">Epoch.</param>
    /// <param name="epoch">Mean elements at the epoch, with the mean motion of Brouwer.</param>
    /// <param name="secular">Secular rates of the near-Earth theory.</param>
    public DeepSpaceTerms(GravityModel gravity, UtcInstant epochUtc, in MeanElements epoch, in SecularRates secular)
    {
        JulianDateUt1 date = epochUtc.ToUt1(0);
        double days = date.Day - 2415020.0 + date.FractionOfDay;
        sun = new ThirdBodyTerms(epoch, ThirdBody.Sun(epoch.NodeRad, days));
        moon = new ThirdBodyTerms(epoch, ThirdBody.Moon(epoch.NodeRad, days));

        (double sinI, double cosI) = Math.SinCos(epoch.InclinationRad);
        bool isFlat = epoch.InclinationRad < SmallInclinationRad || epoch.InclinationRad > Math.PI - SmallInclinationRad;
        double nodeTimesSine = isFlat ? 0 : sun.NodeRateTimesSine + moon.NodeRateTimesSine;
        nodeRate = sinI != 0 ? nodeTimesSine / sinI : nodeTimesSine;
        perigeeRate = sun.PerigeePlusNodeRate + moon.PerigeePlusNodeRate - (cosI * nodeRate);
        eccentricityRate = sun.EccentricityRate + moon.EccentricityRate;
        inclinationRate = sun.InclinationRate + moon.InclinationRate;
        anomalyRate = sun.AnomalyRate + moon.AnomalyRate;

        var rates = new SecularRates(
            secular.AnomalyRadPerMin + anomalyRate, secular.PerigeeRadPerMin, secular.NodeRadPerMin + nodeRate);
        resonance = Resonance.For(gravity, date, epoch, rates, perigeeRate);
    }

    /// <summary>Adds the secular rates and the resonance at a time.</summary>
    /// <param name="minutes">Minutes since the epoch.</param>
    /// <param name="elements">Mean elements with the near-Earth secular terms in.</param>
    public void AddSecular(double minutes, ref MeanElements elements)
    {
        elements.Eccentricity += eccentricityRate * minutes;
        elements.InclinationRad += inclinationRate * minutes;
        elements.PerigeeRad += perigeeRate * minutes;
        elements.NodeRad += nodeRate * minutes;
        elements.AnomalyRad += anomalyRate * minutes;
        resonance?.Apply(minutes, ref elements);
    }

    /// <summary>Adds the long-period terms at a time; at small inclinations in the manner of Lyddane, which has no pole there.</summary>
    /// <param name="minutes">Minutes since the epoch.</param>
    /// <param name="elements">Mean elements with all secular terms in.</param>
    public void AddPeriodics(double minutes, ref MeanElements elements)
    {
        var terms = default(LunisolarPeriodics);
        sun.AddPeriodics(minutes, ref terms);
        moon.AddPeriodics(minutes, ref terms);

        elements.InclinationRad += terms.InclinationRad;
        elements.Eccentricity += terms.Eccentricity;
        (double sinI, double cosI) = Math.SinCos(elements.InclinationRad);
        if (elements.InclinationRad >= LyddaneInclinationRad)
        {
            double nodeRad = terms.NodeTimesSineRad / sinI;
            elements.PerigeeRad += terms.PerigeePlusNodeRad - (cosI * nodeRad);
            elements.NodeRad += nodeRad;
            elements.AnomalyRad += terms.AnomalyRad;
            return;
        }

        (double sinNode, double cosNode) = Math.SinCos(elements.NodeRad);
        double alpha = (sinI * sinNode) + (terms.NodeTimesSineRad * cosNode) + (terms.InclinationRad * cosI * sinNode);
        double beta = (sinI * cosNode) - (terms.NodeTimesSineRad * sinNode) + (terms.InclinationRad * cosI * cosNode);
        double nodeBeforeRad = elements.NodeRad % (2 * Math.PI);
        double longitudeRad = elements.AnomalyRad + elements.PerigeeRad + (cosI * nodeBeforeRad)
            + terms.AnomalyRad + terms.PerigeePlusNodeRad - (terms.InclinationRad * nodeBeforeRad * sinI);
        elements.NodeRad = Math.Atan2(alpha, beta);
        if (Math.Abs(nodeBeforeRad - elements.NodeRad) > Math.PI)
        {
            elements.NodeRad += elements.NodeRad < nodeBeforeRad ? 2 * Math.PI : -2 * Math.PI;
        }

        elements.AnomalyRad += terms.AnomalyRad;
        elements.PerigeeRad = longitudeRad - elements.AnomalyRad - (cosI * elements.NodeRad);
    }
}
