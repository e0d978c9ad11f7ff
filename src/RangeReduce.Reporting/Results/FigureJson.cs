using System.Text.Json;
using RangeReduce.Quantities;

namespace RangeReduce.Reporting.Results;

/// <summary>Writes one figure as a JSON object with the keys of the contract.</summary>
public static class FigureJson
{
    /// <summary>Writes the figure.</summary>
    public static void Write(Utf8JsonWriter json, Figure figure)
    {
        ArgumentNullException.ThrowIfNull(json);
        ArgumentNullException.ThrowIfNull(figure);
        json.WriteStartObject();
        json.WriteString("id", figure.Id);
        json.WriteString("quantity", figure.Quantity.Id);
        if (figure.Hand is { } hand)
        {
            json.WriteString("value", hand.Word());
        }
        else if (double.IsFinite(figure.Value))
        {
            json.WriteNumber("value", figure.Value);
        }
        else
        {
            json.WriteNull("value");
            json.WriteString("why", figure.Why ?? "not a finite number");
        }

        json.WriteString("unit", figure.Unit);
        Text(json, "of", figure.Of);
        Text(json, "state", figure.State);
        Text(json, "otherState", figure.OtherState);
        Text(json, "source", figure.Source?.Word());
        Number(json, "frequencyHz", figure.FrequencyHz);
        Number(json, "lowHz", figure.LowHz);
        Number(json, "highHz", figure.HighHz);
        Number(json, "phiDeg", figure.PhiDeg);
        Number(json, "thetaDeg", figure.ThetaDeg);
        Number(json, "directionDeg", figure.DirectionDeg);
        Text(json, "at", figure.At.Word());
        Text(json, "component", figure.Component.Word());
        Number(json, "threshold", figure.Threshold);
        Number(json, "rank", figure.Rank);
        Text(json, "open", figure.Open);
        Text(json, "method", figure.Method);
        Text(json, "grade", figure.Grade);
        Flag(json, "realized", figure.Realized);
        Flag(json, "backLobe", figure.BackLobe);
        WriteUncertainty(json, figure.Uncertainty);
        json.WriteStartArray("inputs");
        foreach (var input in figure.Origin.Inputs)
        {
            json.WriteStringValue(input);
        }

        json.WriteEndArray();
        Text(json, "formula", figure.Origin.Formula);
        json.WriteEndObject();
    }

    private static void WriteUncertainty(Utf8JsonWriter json, Uncertainty uncertainty)
    {
        json.WriteStartObject("uncertainty");
        json.WriteString("budget", uncertainty.Budget switch
        {
            BudgetState.Full => "full",
            BudgetState.Partial => "partial",
            _ => "absent",
        });
        Number(json, "expanded", Finite(uncertainty.Expanded));
        Number(json, "coverage", Finite(uncertainty.Coverage));
        Number(json, "standard", uncertainty.Standard);
        Number(json, "low", uncertainty.Low);
        Number(json, "high", uncertainty.High);
        json.WriteEndObject();
    }

    private static double? Finite(double value) => double.IsFinite(value) ? value : null;

    private static void Text(Utf8JsonWriter json, string key, string? value)
    {
        if (!string.IsNullOrEmpty(value))
        {
            json.WriteString(key, value);
        }
    }

    private static void Number(Utf8JsonWriter json, string key, double? value)
    {
        if (value is { } number && double.IsFinite(number))
        {
            json.WriteNumber(key, number);
        }
    }

    private static void Flag(Utf8JsonWriter json, string key, bool? value)
    {
        if (value is { } flag)
        {
            json.WriteBoolean(key, flag);
        }
    }
}
