namespace RangeReduce.Reporting.Formatting;

/// <summary>Prints frequencies that are keys rather than results: as short as they are.</summary>
public static class FrequencyText
{
    /// <summary>Prints a frequency with a unit that suits its size, such as 1.62 GHz or 433.92 MHz.</summary>
    public static string WithUnit(double frequencyHz)
    {
        var (unit, factor) = UnitFor(frequencyHz);
        return UnitText.Join(Digits(frequencyHz * factor), unit);
    }

    /// <summary>Prints a number of hertz, megahertz and so on with two decimals at least and six at most.</summary>
    public static string Digits(double value)
    {
        var trimmed = NumberText.Trimmed(value, 6);
        var least = NumberText.Fixed(value, 2);
        return trimmed.Length > least.Length ? trimmed : least;
    }

    /// <summary>Prints a frequency rounded to about five significant digits, for a label in a plot.</summary>
    public static string Label(double frequencyHz)
    {
        var (unit, factor) = UnitFor(frequencyHz);
        return UnitText.Join(NumberText.Fixed(frequencyHz * factor, frequencyHz * factor < 100.0 ? 3 : 1), unit);
    }

    /// <summary>Gives the unit that suits a frequency and the factor from hertz.</summary>
    public static (string Unit, double Factor) UnitFor(double frequencyHz) => Math.Abs(frequencyHz) switch
    {
        >= 0.9995e9 => ("GHz", 1e-9),
        >= 1e6 => ("MHz", 1e-6),
        >= 1e3 => ("kHz", 1e-3),
        _ => ("Hz", 1.0),
    };
}
