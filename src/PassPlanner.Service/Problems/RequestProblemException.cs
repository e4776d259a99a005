using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Problems;

/// <summary>A mistake of the caller, to be answered as a problem.</summary>
public sealed class RequestProblemException(int status, string type, string title, string detail, IReadOnlyList<FieldError>? errors = null)
    : Exception(detail)
{
    /// <summary>HTTP status.</summary>
    public int Status { get; } = status;

    /// <summary>One of <see cref="ProblemTypes"/>.</summary>
    public string Type { get; } = type;

    /// <summary>Title, the same for every problem of the type.</summary>
    public string Title { get; } = title;

    /// <summary>Errors by member.</summary>
    public IReadOnlyList<FieldError> Errors { get; } = errors ?? [];

    /// <summary>A document, query or address with errors in its members.</summary>
    public static RequestProblemException InvalidInput(IReadOnlyList<FieldError> errors) => new(
        StatusCodes.Status400BadRequest,
        ProblemTypes.InvalidInput,
        "The input is not valid",
        errors.Count == 1 ? errors[0].Detail : $"{errors[0].Detail}, and {errors.Count - 1} more",
        errors);

    /// <summary>One bad member of a query or an address.</summary>
    public static RequestProblemException InvalidMember(string name, string detail) =>
        InvalidInput([new FieldError("#/" + name, detail)]);

    /// <summary>No such thing.</summary>
    public static RequestProblemException NotFound(string detail) =>
        new(StatusCodes.Status404NotFound, ProblemTypes.NotFound, "Not found", detail);
}
