using System.Numerics;
using System.Text.Json;

namespace RangeReduce.Tests.Comparison;

/// <summary>The worked pairs of Feature Selective Validation, computed from closed forms.</summary>
internal static class FsvExample
{
    internal static readonly string[] Ids =
    [
        "identical", "offset-only", "gain-10-percent", "fine-ripple", "sign-flip", "resonance-shift-dB", "cos-power-pattern-dB",
        "aperture-pattern-dB", "damped-ringing", "odd-length", "unequal-grids",
    ];

    internal static JsonElement Stored(string id)
    {
        var text = File.ReadAllText(Path.Combine(AppContext.BaseDirectory, "Data", "feature-selective-validation.json"));
        using var document = JsonDocument.Parse(text);
        return document.RootElement.GetProperty("examples").EnumerateArray().Single(example => string.Equals(example.GetProperty("id").GetString(), id, StringComparison.Ordinal)).Clone();
    }

    internal static (double[] X1, double[] Y1, double[] X2, double[] Y2) Curves(string id)
    {
        var stored = Stored(id);
        var x1 = Axis(stored.TryGetProperty("x", out var common) ? common : stored.GetProperty("x1"));
        var x2 = Axis(stored.TryGetProperty("x", out common) ? common : stored.GetProperty("x2"));
        var (first, second) = Formulas(id);
        return (x1, Array.ConvertAll(x1, value => first(value)), x2, Array.ConvertAll(x2, value => second(value)));
    }

    private static double[] Axis(JsonElement axis)
    {
        var (first, last, count) = (axis.GetProperty("first").GetDouble(), axis.GetProperty("last").GetDouble(), axis.GetProperty("count").GetInt32());
        return [.. Enumerable.Range(0, count).Select(n => first + ((last - first) * n / (count - 1)))];
    }

    private static (Func<double, double> First, Func<double, double> Second) Formulas(string id) => id switch
    {
        "identical" => (TwoTones, TwoTones),
        "offset-only" => (TwoTones, x => TwoTones(x) + 1.0),
        "gain-10-percent" => (TwoTones, x => 1.1 * TwoTones(x)),
        "fine-ripple" => (TwoTones, x => TwoTones(x) + (0.2 * Math.Sin(2.0 * Math.PI * 90.0 * x))),
        "sign-flip" => (TwoTones, x => -TwoTones(x)),
        "resonance-shift-dB" => (x => ResonanceDb(x, 1.5), x => ResonanceDb(x, 1.515)),
        "cos-power-pattern-dB" => (x => BeamDb(x, 4.0), x => BeamDb(x, 4.4)),
        "aperture-pattern-dB" => (x => ApertureDb(x, 5.0), x => ApertureDb(x, 5.2)),
        "damped-ringing" => (x => Math.Exp(-3.0 * x) * Math.Cos(40.0 * x), x => Math.Exp(-3.3 * x) * Math.Cos(41.0 * x)),
        "odd-length" => (x => 3.0 + Math.Sin(30.0 * x), x => 3.0 + (0.2 * x) + Math.Sin(30.0 * x)),
        "unequal-grids" => (x => 2.0 + Math.Sin(12.0 * x) + (0.2 * Math.Cos(70.0 * x)), x => 2.1 + Math.Sin(12.2 * x) + (0.2 * Math.Cos(71.0 * x))),
        _ => throw new ArgumentOutOfRangeException(nameof(id), id, "There is no such pair."),
    };

    private static double TwoTones(double x) => 5.0 + Math.Sin(2.0 * Math.PI * 8.0 * x) + (0.5 * Math.Sin(2.0 * Math.PI * 40.0 * x));

    private static double ResonanceDb(double x, double centre) =>
        20.0 * Math.Log10((1.0 - (0.9 / new Complex(1.0, 40.0 * (x - centre) / centre))).Magnitude);

    private static double BeamDb(double deg, double power) => 10.0 * Math.Log10(Math.Pow(Math.Cos(deg * Math.PI / 180.0), power) + 1e-4);

    private static double ApertureDb(double deg, double wavelengths)
    {
        var z = Math.PI * wavelengths * Math.Sin(deg * Math.PI / 180.0);
        return 20.0 * Math.Log10(Math.Abs(z == 0.0 ? 1.0 : Math.Sin(z) / z) + 0.01);
    }
}
