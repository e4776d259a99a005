using System.Net;
using System.Text.RegularExpressions;
using PassPlanner.Tests;

namespace PassPlanner.Service.Tests;

/// <summary>The request files that people paste from work as they stand, in order.</summary>
public partial class RequestFilesTests
{
    [Fact]
    public async Task Every_request_of_every_file_is_answered()
    {
        string folder = Path.Combine(ReferenceData.PathOf(".."), "requests");
        string[] files = [.. Directory.GetFiles(folder, "*.http").Order(StringComparer.Ordinal)];
        Assert.True(files.Length >= 3);
        using var host = new ServiceHost(nowUtc: "2022-01-23T00:00:00Z");
        foreach (string file in files)
        {
            foreach (string block in Separator().Split(await File.ReadAllTextAsync(file)).Where(b => b.Trim().Length > 0))
            {
                await SendAsync(host, Path.GetFileName(file), block);
            }
        }
    }

    private static async Task SendAsync(ServiceHost host, string file, string block)
    {
        string[] lines = [.. block.Split('\n').Select(l => l.TrimEnd('\r')).SkipWhile(l => l.Length == 0 || l[0] is '#' or '@')];
        if (lines.Length == 0)
        {
            return;
        }

        string[] start = lines[0].Split(' ');
        int blank = Array.FindIndex(lines, l => l.Length == 0);
        string[] headers = lines[1..(blank < 0 ? lines.Length : blank)];
        string body = blank < 0 ? "" : string.Join('\n', lines[(blank + 1)..]).Trim();
        string contentType = headers.FirstOrDefault(h => h.StartsWith("Content-Type:", StringComparison.OrdinalIgnoreCase))?.Split(':', 2)[1].Trim() ?? "application/json";
        string url = start[1].Replace("{{service}}", "", StringComparison.Ordinal);
        using HttpResponseMessage response = await host.SendAsync(new HttpMethod(start[0]), url, body.Length == 0 ? null : body, contentType: contentType);
        Assert.True((int)response.StatusCode < 300, $"{file}: {lines[0]}: {response.StatusCode} {await response.Content.ReadAsStringAsync()}");
        Assert.NotEqual(HttpStatusCode.NoContent, response.StatusCode);
    }

    [GeneratedRegex(@"^###.*$", RegexOptions.Multiline)]
    private static partial Regex Separator();
}
