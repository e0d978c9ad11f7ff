using RangeReduce.Quantities;

namespace RangeReduce.Reporting.Formatting;

/// <summary>Prints figures: the value in its printed unit, rounded by its uncertainty where there is one.</summary>
public static class FigureText
{
    private static readonly string PlusMinus = $"{UnitText.NoBreakSpace}±{UnitText.NoBreakSpace}";

    /// <summary>Prints a figure without unit, as for a table whose heading or row names the unit.</summary>
    public static string Number(Figure figure)
    {
        ArgumentNullException.ThrowIfNull(figure);
        return figure.Hand is { } hand ? HandWord(hand) : Number(figure.Value, figure.Uncertainty, PrintedAs(figure));
    }

    /// <summary>Prints a figure with its unit, as for a sentence.</summary>
    public static string WithUnit(Figure figure) => UnitText.Join(Number(figure), Unit(figure));

    /// <summary>Gives the printed unit of a figure; a deviation has that of the quantity that it is of.</summary>
    public static string Unit(Figure figure)
    {
        ArgumentNullException.ThrowIfNull(figure);
        var unit = UnitText.Of(PrintedAs(figure), figure.Component);

        // A difference of two gains is a ratio: the isotropic reference has dropped out.
        return figure.Quantity == QuantityCatalogue.Deviation && unit.StartsWith("dBi", StringComparison.Ordinal) ? "dB" : unit;
    }

    /// <summary>Prints a value of a quantity without uncertainty and without unit.</summary>
    public static string Plain(double value, Quantity quantity)
    {
        ArgumentNullException.ThrowIfNull(quantity);
        return NumberText.Fixed(value * quantity.PrintFactor, quantity.Decimals);
    }

    /// <summary>Prints a hand in words.</summary>
    public static string HandWord(Hand hand) => hand switch
    {
        Hand.Right => "right",
        Hand.Left => "left",
        _ => "linear",
    };

    /// <summary>Gives the quantity whose printing rules a figure follows.</summary>
    internal static Quantity PrintedAs(Figure figure) =>
        figure.Of is { } of && figure.Quantity == QuantityCatalogue.Deviation && QuantityCatalogue.TryGet(of, out var quantity) ? quantity : figure.Quantity;

    private static string Number(double value, Uncertainty uncertainty, Quantity quantity)
    {
        var factor = quantity.PrintFactor;
        if (uncertainty is { Low: { } low, High: { } high } && double.IsFinite(value) && high > value && value > low)
        {
            var (up, down) = ((high - value) * factor, (value - low) * factor);
            var decimals = UncertaintyRounding.DecimalsFor(Math.Min(up, down));
            return $"{NumberText.Fixed(value * factor, decimals)}{UnitText.NoBreakSpace}+{NumberText.Fixed(up, decimals)}/{NumberText.Minus}{NumberText.Fixed(down, decimals)}";
        }

        if (!double.IsFinite(value) || !double.IsFinite(uncertainty.Expanded) || uncertainty.Expanded <= 0.0)
        {
            return NumberText.Fixed(value * factor, quantity.Decimals);
        }

        var (printed, expanded) = UncertaintyRounding.Print(value * factor, uncertainty.Expanded * factor);
        return printed + PlusMinus + expanded;
    }
}
