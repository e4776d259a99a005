using PassPlanner.Physics.Time;
using PassPlanner.Planning.Links;

namespace PassPlanner.Service.Passes;

/// <summary>The address of one pass by one link.</summary>
/// <param name="Spacecraft">Spacecraft.</param>
/// <param name="Station">Station.</param>
/// <param name="InstantUtc">An instant within the pass.</param>
/// <param name="Link">Link.</param>
public sealed record PassAddress(string Spacecraft, string Station, UtcInstant InstantUtc, Link Link)
{
    /// <summary>The address, or that of a part of it, such as /timeline.</summary>
    public string Of(string part) =>
        $"/api/v1/passes/{Spacecraft}/{Station}/{InstantUtc}{part}?antenna={Link.Antenna.Id}&link={LinkSelector.TextOf(Link)}";
}
