using RangeReduce.Reporting.Formatting;

namespace RangeReduce.Reporting.Plots;

/// <summary>The unit in which a plot prints frequencies.</summary>
/// <param name="Name">The unit.</param>
/// <param name="Factor">Factor from hertz.</param>
internal readonly record struct FrequencyUnit(string Name, double Factor)
{
    /// <summary>Gives the title of a frequency axis.</summary>
    public string Title => $"Frequency ({Name})";

    /// <summary>Gives the unit that suits the upper end of some sweeps.</summary>
    public static FrequencyUnit For(double mostHz)
    {
        var (name, factor) = FrequencyText.UnitFor(mostHz);
        return new(name, factor);
    }

    /// <summary>Turns frequencies in hertz into this unit.</summary>
    public double[] Of(double[] frequencyHz)
    {
        var factor = Factor;
        return Array.ConvertAll(frequencyHz, value => value * factor);
    }
}
