using System.Reflection;

namespace RangeReduce.Reporting.Tests;

public sealed class AssemblyTests
{
    [Fact]
    public void Reporting_knows_neither_the_archive_nor_the_command_line()
    {
        var names = Assembly.Load("RangeReduce.Reporting").GetReferencedAssemblies().Select(name => name.Name);
        Assert.DoesNotContain(names, name => name is "RangeReduce.Archive" or "RangeReduce.Cli");
    }
}
