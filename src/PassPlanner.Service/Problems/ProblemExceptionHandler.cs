using Microsoft.AspNetCore.Diagnostics;
using Microsoft.AspNetCore.Mvc;

namespace PassPlanner.Service.Problems;

/// <summary>Turns exceptions into problems: the caller's mistakes in full, our own without a word of the inside.</summary>
public sealed class ProblemExceptionHandler(IProblemDetailsService problems) : IExceptionHandler
{
    /// <inheritdoc/>
    public async ValueTask<bool> TryHandleAsync(HttpContext httpContext, Exception exception, CancellationToken cancellationToken)
    {
        if (exception is OperationCanceledException && httpContext.RequestAborted.IsCancellationRequested)
        {
            return true;
        }

        ProblemDetails problem = Describe(exception);
        httpContext.Response.StatusCode = problem.Status ?? StatusCodes.Status500InternalServerError;
        await problems.WriteAsync(new ProblemDetailsContext { HttpContext = httpContext, ProblemDetails = problem });
        return true;
    }

    private static ProblemDetails Describe(Exception exception)
    {
        switch (exception)
        {
            case RequestProblemException request:
                var described = new ProblemDetails
                {
                    Status = request.Status,
                    Type = request.Type,
                    Title = request.Title,
                    Detail = request.Message,
                };
                if (request.Errors.Count > 0)
                {
                    described.Extensions["errors"] = request.Errors;
                }

                return described;

            case BadHttpRequestException { StatusCode: StatusCodes.Status413PayloadTooLarge }:
                return new ProblemDetails
                {
                    Status = StatusCodes.Status413PayloadTooLarge,
                    Type = ProblemTypes.UnreadableBody,
                    Title = "The body is too large",
                    Detail = "The body is larger than this address takes",
                };

            case BadHttpRequestException bad:
                return new ProblemDetails
                {
                    Status = bad.StatusCode,
                    Type = ProblemTypes.UnreadableBody,
                    Title = "The request cannot be read",
                    Detail = "The request's address, headers or body cannot be read",
                };

            default:
                return new ProblemDetails
                {
                    Status = StatusCodes.Status500InternalServerError,
                    Type = ProblemTypes.Internal,
                    Title = "The service failed",
                    Detail = "The service failed while it worked on this request; its log says more",
                };
        }
    }
}
