using System.Globalization;
using RangeReduce.Quantities;
using RangeReduce.Runs;

namespace RangeReduce.Comparison;

/// <summary>Says a requirement in words.</summary>
internal static class RequirementWords
{
    /// <summary>Gives a sentence without full stop, such as <c>axial ratio of state right on the axis at most 3 dB from 1.58 to 1.64 GHz</c>.</summary>
    public static string Of(Requirement requirement)
    {
        var quantity = requirement.Quantity;
        var words = new List<string> { quantity.Name };
        if (requirement.Component.Word() is { } component)
        {
            words.Add(requirement.Component is FieldComponent.Right or FieldComponent.Left ? $"({component}-hand)" : $"({component})");
        }

        if (requirement.State is { } state)
        {
            words.Add($"of state {state}");
        }

        if (requirement.OtherState is { } other)
        {
            words.Add($"against state {other}");
        }

        words.Add((requirement.AtLeast, requirement.AtMost, requirement.EqualTo) switch
        {
            ({ } low, { } high, _) => $"between {Print(low)} and {Print(high)}{Unit()}",
            ({ } low, null, _) => $"at least {Print(low)}{Unit()}",
            (null, { } high, _) => $"at most {Print(high)}{Unit()}",
            (_, _, { } hand) => hand == Hand.Linear ? "is linear" : $"is {hand.Word()}-hand",
            _ => "without a bound",
        });
        if (requirement is { BandLowHz: { } from, BandHighHz: { } to })
        {
            words.Add(string.Create(CultureInfo.InvariantCulture, $"from {from / 1e9:0.####} to {to / 1e9:0.####} GHz"));
        }

        if (requirement.ConeDeg is { } cone)
        {
            words.Add(string.Create(CultureInfo.InvariantCulture, $"within {cone:0.##}° of the axis"));
        }

        return string.Join(' ', words);

        string Print(double value) => (value * quantity.PrintFactor).ToString("0.####", CultureInfo.InvariantCulture).Replace('-', '\u2212');

        string Unit() => quantity.PrintUnit switch
        {
            "" or "1" => string.Empty,
            "°" => "°",
            var unit => $" {unit}",
        };
    }
}
