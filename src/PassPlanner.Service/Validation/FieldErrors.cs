namespace PassPlanner.Service.Validation;

/// <summary>The errors found in one document, in the order in which they were found.</summary>
public sealed class FieldErrors
{
    private readonly List<FieldError> items = [];

    /// <summary>The errors.</summary>
    public IReadOnlyList<FieldError> Items => items;

    /// <summary>Whether there are any.</summary>
    public bool Any => items.Count > 0;

    /// <summary>Adds an error.</summary>
    public void Add(string pointer, string detail) => items.Add(new FieldError(pointer, detail));

    /// <summary>
    /// Runs a step that builds a domain object; what the domain refuses becomes an error at the member
    /// that it names below the pointer.
    /// Returns the default value then.
    /// </summary>
    public T? Try<T>(string pointer, Func<T> build)
    {
        try
        {
            return build();
        }
        catch (ArgumentException refused)
        {
            // The parameter name that .NET appends is for programmers; the sentence before it is for the user.
            int tail = refused.Message.IndexOf(" (Parameter '", StringComparison.Ordinal);
            Add(refused.ParamName is null ? pointer : $"{pointer}/{refused.ParamName}", tail < 0 ? refused.Message : refused.Message[..tail]);
            return default;
        }
    }
}
