namespace RangeReduce.Reporting.Formatting;

/// <summary>Rounding of a value with its uncertainty: two significant digits of the uncertainty, the value to match (JCGM 100:2008, 7.2.6).</summary>
public static class UncertaintyRounding
{
    /// <summary>Gives the count of decimals that leaves two significant digits of an uncertainty; negative for tens and more.</summary>
    /// <param name="expanded">The uncertainty, above zero and finite.</param>
    /// <exception cref="ArgumentOutOfRangeException">The uncertainty is not above zero or not finite.</exception>
    public static int DecimalsFor(double expanded)
    {
        if (!double.IsFinite(expanded) || expanded <= 0.0)
        {
            throw new ArgumentOutOfRangeException(nameof(expanded), expanded, "An uncertainty is above zero and finite.");
        }

        var decimals = 1 - Exponent(expanded);

        // 0.0996 becomes 0.10 and not 0.100: rounding up has brought a digit.
        return Exponent(NumberText.Round(expanded, decimals)) > Exponent(expanded) ? decimals - 1 : decimals;
    }

    /// <summary>Prints a value and its uncertainty, both in the same unit, to matching digits.</summary>
    public static (string Value, string Expanded) Print(double value, double expanded)
    {
        var decimals = DecimalsFor(expanded);
        return (NumberText.Fixed(value, decimals), NumberText.Fixed(expanded, decimals));
    }

    // The guard keeps 0.1, whose logarithm may come out a hair under -1, in its decade.
    private static int Exponent(double value) => (int)Math.Floor(Math.Log10(value) + 1e-12);
}
