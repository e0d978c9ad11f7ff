using System.Numerics;
using System.Text.Json;

namespace RangeReduce.Tests.Patterns;

/// <summary>The computed cases of known polarization.</summary>
internal static class PolarizationCases
{
    private static readonly JsonElement Root = JsonDocument.Parse(File.ReadAllBytes(Path.Combine(AppContext.BaseDirectory, "Data", "polarization-ellipses.json"))).RootElement;

    public static IEnumerable<JsonElement> Fields => Root.GetProperty("fields").EnumerateArray();

    public static IEnumerable<(double CrossDb, double AxialRatioDb)> CrossPolarTable =>
        Root.GetProperty("cross_ratio_to_axial_ratio").EnumerateArray().Concat(Root.GetProperty("axial_ratio_to_cross_ratio").EnumerateArray())
            .Select(row => (row.GetProperty("cross_ratio_db").GetDouble(), row.GetProperty("axial_ratio_db").GetDouble()));

    public static JsonElement Field(string id) => Fields.Single(each => string.Equals(each.GetProperty("id").GetString(), id, StringComparison.Ordinal));

    public static Complex ComplexOf(this JsonElement field, string key) => new(field.GetProperty(key)[0].GetDouble(), field.GetProperty(key)[1].GetDouble());

    public static double? NumberOf(this JsonElement field, string key) => field.GetProperty(key) is { ValueKind: JsonValueKind.Number } number ? number.GetDouble() : null;
}
