using RangeReduce.Numerics;
using RangeReduce.Patterns;
using RangeReduce.Quantities;
using RangeReduce.Runs;

namespace RangeReduce.Reduction;

/// <summary>The level that a noise floor in decibels is stated against: the strongest sample that the receiver saw in cuts of the same kind.</summary>
/// <remarks>A receiver's noise does not fall with the antenna: a state that hardly radiates lies that much nearer to it.</remarks>
public static class NoiseReference
{
    /// <summary>Gives the amplitude of the strongest measured sample among cuts of the same basis and level reference.</summary>
    public static double AmplitudeOf(MeasurementRun run, StateCut like)
    {
        ArgumentNullException.ThrowIfNull(run);
        ArgumentNullException.ThrowIfNull(like);
        var strongest = 0.0;
        foreach (var cut in run.Cuts)
        {
            if (cut.Source == DataSource.Measured && cut.Cut.Basis == like.Cut.Basis && cut.Cut.Reference == like.Cut.Reference)
            {
                strongest = Math.Max(strongest, Math.Max(Strongest(cut.Cut.First), Strongest(cut.Cut.Second)));
            }
        }

        return Math.Sqrt(strongest);
    }

    /// <summary>Gives the stated noise floor in the decibels of a cut; −∞ where none is stated.</summary>
    public static double FloorDb(MeasurementRun run, StateCut cut)
    {
        ArgumentNullException.ThrowIfNull(run);
        ArgumentNullException.ThrowIfNull(cut);
        var term = cut.Source == DataSource.Measured ? run.UncertaintyTerms.FirstOrDefault(term => term.Name is "noise-floor") : null;
        return term is null ? double.NegativeInfinity : Decibels.OfAmplitude(AmplitudeOf(run, cut)) - Math.Abs(term.Value);
    }

    private static double Strongest(PatternChannel? channel)
    {
        var strongest = 0.0;
        for (var i = 0; i < (channel?.Re.Length ?? 0); i++)
        {
            // A missing sample is NaN, and the larger of it and a number is taken to be the number.
            strongest = channel!.Power(i) > strongest ? channel.Power(i) : strongest;
        }

        return strongest;
    }
}
