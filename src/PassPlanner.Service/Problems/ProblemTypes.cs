namespace PassPlanner.Service.Problems;

/// <summary>The kinds of problem that the service answers with (RFC 9457 "type"); programs may rely on them.</summary>
public static class ProblemTypes
{
    /// <summary>A document, a query or an address has members that are missing, unknown, of the wrong type or out of range.</summary>
    public const string InvalidInput = "urn:pass-planner:problem:invalid-input";

    /// <summary>The body is not the JSON, or not the text, that it claims to be.</summary>
    public const string UnreadableBody = "urn:pass-planner:problem:unreadable-body";

    /// <summary>There is no such thing.</summary>
    public const string NotFound = "urn:pass-planner:problem:not-found";

    /// <summary>A thing with this identifier exists already.</summary>
    public const string AlreadyExists = "urn:pass-planner:problem:already-exists";

    /// <summary>The profile has changed since it was read.</summary>
    public const string RevisionConflict = "urn:pass-planner:problem:revision-conflict";

    /// <summary>The request must say which revision it changes.</summary>
    public const string RevisionRequired = "urn:pass-planner:problem:revision-required";

    /// <summary>Something else depends on the thing to be deleted.</summary>
    public const string HasDependents = "urn:pass-planner:problem:has-dependents";

    /// <summary>The service failed; the log says more.</summary>
    public const string Internal = "urn:pass-planner:problem:internal";
}
