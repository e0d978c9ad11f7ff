using RangeReduce.Diagnostics;
using Tomlyn.Syntax;

namespace RangeReduce.Runs.Manifest;

/// <summary>One key and its value, with the places of both.</summary>
internal sealed record ManifestEntry(string Key, SourcePlace KeyPlace, ValueSyntax Value, SourcePlace ValuePlace);
