using System.Globalization;
using PassPlanner.Service.Problems;

namespace PassPlanner.Service.Profiles;

/// <summary>The revision of a profile as an entity tag (RFC 9110, section 8.8.3): the number in quotes.</summary>
public static class EntityTag
{
    /// <summary>The tag of a revision.</summary>
    public static string Of(int revision) => $"\"{revision.ToString(CultureInfo.InvariantCulture)}\"";

    /// <summary>The revision that If-Match names; a problem when the header is missing or no such tag.</summary>
    public static int Required(HttpRequest request) => Optional(request) ?? throw new RequestProblemException(
        StatusCodes.Status428PreconditionRequired,
        ProblemTypes.RevisionRequired,
        "Say which revision you change",
        "The request needs If-Match with the ETag of the revision that it changes, such as If-Match: \"3\"");

    /// <summary>The revision that If-Match names, or nothing when the header is missing.</summary>
    public static int? Optional(HttpRequest request)
    {
        string text = request.Headers.IfMatch.ToString();
        if (text.Length == 0 || text == "*")
        {
            return null;
        }

        if (text is ['"', .. var digits, '"']
            && int.TryParse(digits, NumberStyles.None, CultureInfo.InvariantCulture, out int revision))
        {
            return revision;
        }

        throw RequestProblemException.InvalidMember("If-Match", "If-Match must be one ETag as this service writes it, such as \"3\"");
    }
}
