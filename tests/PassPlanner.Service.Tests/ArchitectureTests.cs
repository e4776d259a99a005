using System.Reflection;
using PassPlanner.Exchange.ElementSets;
using PassPlanner.Physics.Orbits;
using PassPlanner.Planning.Profiles;
using PassPlanner.Store;

namespace PassPlanner.Service.Tests;

/// <summary>The arrows between the rooms, and what each room bans.</summary>
public class ArchitectureTests
{
    private static readonly Assembly Physics = typeof(ElementSet).Assembly;
    private static readonly Assembly Planning = typeof(Station).Assembly;
    private static readonly Assembly Exchange = typeof(ElementSetReader).Assembly;
    private static readonly Assembly Store = typeof(PlannerDatabase).Assembly;

    [Fact]
    public void Physics_uses_no_other_room() => Assert.Empty(Rooms(Physics));

    [Fact]
    public void Planning_uses_Physics_alone() => Assert.Equal(["PassPlanner.Physics"], Rooms(Planning));

    [Fact]
    public void Exchange_uses_Physics_and_Planning_at_most() =>
        Assert.Subset(new HashSet<string> { "PassPlanner.Physics", "PassPlanner.Planning" }, Rooms(Exchange).ToHashSet());

    [Fact]
    public void Store_uses_Physics_and_Planning_at_most() =>
        Assert.Subset(new HashSet<string> { "PassPlanner.Physics", "PassPlanner.Planning" }, Rooms(Store).ToHashSet());

    [Fact]
    public void Physics_takes_no_package_but_the_numerics_library() =>
        Assert.Equal(["MathNet.Numerics"], Physics.GetReferencedAssemblies().Select(a => a.Name!).Where(IsPackage));

    [Theory]
    [InlineData("System.Net")]
    [InlineData("System.Data")]
    [InlineData("Microsoft.Data")]
    [InlineData("Microsoft.AspNetCore")]
    [InlineData("System.IO.FileSystem")]
    public void Physics_and_Planning_reach_no_network_no_database_and_no_file(string banned)
    {
        Assert.DoesNotContain(Physics.GetReferencedAssemblies(), a => a.Name!.StartsWith(banned, StringComparison.Ordinal));
        Assert.DoesNotContain(Planning.GetReferencedAssemblies(), a => a.Name!.StartsWith(banned, StringComparison.Ordinal));
    }

    [Fact]
    public void Exchange_reads_streams_and_knows_neither_HTTP_nor_SQL() => Assert.DoesNotContain(
        Exchange.GetReferencedAssemblies(),
        a => a.Name!.StartsWith("Microsoft.AspNetCore", StringComparison.Ordinal)
            || a.Name.StartsWith("System.Net", StringComparison.Ordinal)
            || a.Name.StartsWith("Microsoft.Data", StringComparison.Ordinal));

    [Fact]
    public void Store_knows_no_HTTP() => Assert.DoesNotContain(
        Store.GetReferencedAssemblies(), a => a.Name!.StartsWith("Microsoft.AspNetCore", StringComparison.Ordinal));

    [Fact]
    public void No_public_member_of_Physics_or_Planning_takes_or_gives_a_DateTime()
    {
        IEnumerable<MethodInfo> methods = new[] { Physics, Planning }.SelectMany(a => a.GetExportedTypes())
            .SelectMany(t => t.GetMethods(BindingFlags.Public | BindingFlags.Instance | BindingFlags.Static | BindingFlags.DeclaredOnly));
        Assert.DoesNotContain(methods, m => m.ReturnType == typeof(DateTime) || m.GetParameters().Any(p => p.ParameterType == typeof(DateTime)));
    }

    private static IEnumerable<string> Rooms(Assembly room) =>
        room.GetReferencedAssemblies().Select(a => a.Name!).Where(name => name.StartsWith("PassPlanner.", StringComparison.Ordinal)).Order(StringComparer.Ordinal);

    private static bool IsPackage(string name) =>
        !name.StartsWith("System", StringComparison.Ordinal) && !name.StartsWith("PassPlanner.", StringComparison.Ordinal) && name != "netstandard";
}
