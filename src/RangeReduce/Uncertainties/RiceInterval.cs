using MathNet.Numerics;

namespace RangeReduce.Uncertainties;

/// <summary>Confidence interval for the length of a vector in the plane from one noisy reading of it (Rice distribution).</summary>
/// <remarks>
/// The length of a vector plus noise is pushed up: near zero the spread of trials about the reading never reaches down to the truth.
/// So the interval is had by turning the question round (Neyman): which true lengths make the reading no rarer than 2.5 % on either side.
/// All lengths are in units of the standard deviation of one of the two parts.
/// </remarks>
internal static class RiceInterval
{
    /// <summary>Above this the distribution is normal to within a percent.</summary>
    public const double NormalFrom = 5.0;

    private const double Tail = 0.025;
    private const double Step = 0.1;

    private static readonly Lazy<(double Low, double High)[]> Table = new(MakeTable);

    /// <summary>Gives the 95 % interval of the true length.</summary>
    /// <param name="reading">The length that was read, from 0 to <see cref="NormalFrom"/>.</param>
    public static (double Low, double High) Of(double reading)
    {
        var table = Table.Value;
        var at = Math.Clamp(reading / Step, 0.0, table.Length - 1.0);
        var index = Math.Min((int)at, table.Length - 2);
        var share = at - index;
        return (
            table[index].Low + (share * (table[index + 1].Low - table[index].Low)),
            table[index].High + (share * (table[index + 1].High - table[index].High)));
    }

    /// <summary>Gives the probability that a reading of a true length is at most <paramref name="reading"/>.</summary>
    public static double Cumulative(double reading, double trueLength)
    {
        // Simpson's rule over the density r exp(−(r − ν)²/2) · I0(rν) e^(−rν); it is smooth and short-tailed.
        const int Intervals = 100;
        var from = Math.Max(0.0, trueLength - 9.0);
        if (reading <= from)
        {
            return 0.0;
        }

        var step = (reading - from) / Intervals;
        var sum = 0.0;
        for (var i = 0; i <= Intervals; i++)
        {
            var weight = i is 0 or Intervals ? 1.0 : i % 2 == 1 ? 4.0 : 2.0;
            sum += weight * Density(from + (i * step), trueLength);
        }

        return Math.Min(1.0, sum * step / 3.0);
    }

    private static double Density(double r, double trueLength)
    {
        var product = r * trueLength;
        var distance = r - trueLength;
        return r * Math.Exp(-0.5 * distance * distance) * SpecialFunctions.BesselI0(Math.Min(product, 600.0)) * Math.Exp(-Math.Min(product, 600.0));
    }

    private static (double Low, double High)[] MakeTable()
    {
        var table = new (double, double)[(int)Math.Round(NormalFrom / Step) + 2];
        for (var i = 0; i < table.Length; i++)
        {
            var reading = i * Step;
            table[i] = (Solve(length => Cumulative(reading, length) - (1.0 - Tail)), Solve(length => Cumulative(reading, length) - Tail));
        }

        return table;

        // The probability of a smaller reading falls as the true length grows.
        static double Solve(Func<double, double> excess) => excess(0.0) <= 0.0 ? 0.0 : Numerics.Bisection.Root(excess, 0.0, NormalFrom + 6.0);
    }
}
