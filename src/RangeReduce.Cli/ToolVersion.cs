using System.Reflection;

namespace RangeReduce.Cli;

/// <summary>The version of the program.</summary>
internal static class ToolVersion
{
    /// <summary>Gets the version as it stands in results and reports.</summary>
    public static string Text { get; } = typeof(ToolVersion).Assembly.GetCustomAttribute<AssemblyInformationalVersionAttribute>()?.InformationalVersion ?? "0.0.0";
}
