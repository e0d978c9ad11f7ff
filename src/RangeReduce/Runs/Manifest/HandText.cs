using RangeReduce.Quantities;

namespace RangeReduce.Runs.Manifest;

/// <summary>The words for a hand and for a field component.</summary>
internal static class HandText
{
    /// <summary>Hands.</summary>
    public static readonly IReadOnlyDictionary<string, Hand> Hands = new Dictionary<string, Hand>(StringComparer.Ordinal)
    {
        ["right"] = Hand.Right,
        ["left"] = Hand.Left,
        ["linear"] = Hand.Linear,
    };

    /// <summary>Components.</summary>
    public static readonly IReadOnlyDictionary<string, FieldComponent> Components = new Dictionary<string, FieldComponent>(StringComparer.Ordinal)
    {
        ["right"] = FieldComponent.Right,
        ["left"] = FieldComponent.Left,
        ["theta"] = FieldComponent.Theta,
        ["phi"] = FieldComponent.Phi,
        ["co"] = FieldComponent.Co,
        ["cross"] = FieldComponent.Cross,
        ["total"] = FieldComponent.Total,
    };

    /// <summary>Gives the word of a hand.</summary>
    public static string Write(Hand hand) => Hands.First(pair => pair.Value == hand).Key;

    /// <summary>Gives the word of a component.</summary>
    public static string Write(FieldComponent component) => Components.First(pair => pair.Value == component).Key;
}
