using System.Reflection;

namespace RangeReduce.Cli.Tests;

public sealed class AssemblyTests
{
    [Fact]
    public void Only_the_command_line_uses_the_terminal_library()
    {
        var names = Assembly.Load("RangeReduce").GetReferencedAssemblies().Concat(Assembly.Load("RangeReduce.Reporting").GetReferencedAssemblies());
        Assert.DoesNotContain(names, name => name.Name is "Spectre.Console" or "System.CommandLine");
    }
}
