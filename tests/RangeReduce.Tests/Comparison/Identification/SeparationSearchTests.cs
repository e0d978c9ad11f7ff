using RangeReduce.Comparison.Identification;

namespace RangeReduce.Tests.Comparison.Identification;

/// <summary>Which band would tell the states apart best.</summary>
public sealed class SeparationSearchTests
{
    [Fact]
    public void The_nearest_pair_is_the_two_hands_and_the_best_band_holds_their_resonances()
    {
        Assert.True(SweepIdentifier.TryBuild(new SyntheticAntenna(21).Run(4, 0.005), out var identifier, out _));
        var pairs = SeparationSearch.Pairs(identifier!);
        Assert.Equal(3, pairs.Count);
        Assert.Equal(("left", "right"), (pairs[0].FirstState, pairs[0].SecondState));
        var band = SeparationSearch.BestBand(identifier!, 100e6)!;
        Assert.Equal(100e6, band.HighHz - band.LowHz, 1.0);
        Assert.InRange(band.LowHz, 1.55e9, 1.62e9);
        Assert.InRange(band.Distance, 0.0, pairs[0].Distance);
    }

    [Fact]
    public void The_distance_does_not_grow_with_the_noise_of_the_signatures()
    {
        // 0.1 against 0.001 of noise: a hundredth of the distance, although the noisy signatures themselves lie much farther apart.
        Assert.True(SweepIdentifier.TryBuild(new SyntheticAntenna(21).Run(4, 0.001), out var quiet, out _, new IdentificationOptions { NoiseStandardDeviation = 0.001 }));
        Assert.True(SweepIdentifier.TryBuild(new SyntheticAntenna(21).Run(4, 0.1), out var noisy, out _, new IdentificationOptions { NoiseStandardDeviation = 0.1 }));
        Assert.Equal(0.01 * SeparationSearch.Pairs(quiet!)[0].Distance, SeparationSearch.Pairs(noisy!)[0].Distance, 3.0);
    }

    [Fact]
    public void The_error_probability_is_that_of_sweeps_that_were_drawn()
    {
        // Noise so high that the two hands are mistaken often enough to be counted; a bare likelihood comparison, no test against unknown.
        var (wrong, total, predicted) = (0, 0, 0.0);
        for (var seed = 0; seed < 20; seed++)
        {
            var antenna = new SyntheticAntenna(100 + seed);
            var options = new IdentificationOptions { NoiseStandardDeviation = 0.12, FalseAlarmRate = 0.0, LeastProbability = 0.0 };
            Assert.True(SweepIdentifier.TryBuild(antenna.Run(4, 0.12), out var identifier, out _, options));
            predicted += SeparationSearch.Pairs(identifier!)[0].ErrorProbability / 20.0;
            foreach (var state in new[] { "left", "right" })
            {
                for (var n = 0; n < 200; n++)
                {
                    wrong += string.Equals(identifier!.Identify(antenna.Sweep(state, 0.12)).State, state, StringComparison.Ordinal) ? 0 : 1;
                    total++;
                }
            }
        }

        Assert.InRange((double)wrong / total, 0.5 * predicted, 2.0 * predicted);
    }

    [Theory]
    [InlineData(5e6)] // fewer than 8 points
    [InlineData(2e9)] // wider than the sweep
    public void A_width_that_cannot_be_had_gives_no_band(double widthHz)
    {
        Assert.True(SweepIdentifier.TryBuild(new SyntheticAntenna(21).Run(3, 0.005), out var identifier, out _));
        Assert.Null(SeparationSearch.BestBand(identifier!, widthHz));
    }

    [Fact]
    public void Without_phase_the_states_lie_nearer()
    {
        Assert.True(SweepIdentifier.TryBuild(new SyntheticAntenna(21).Run(4, 0.005), out var identifier, out _));
        Assert.True(SeparationSearch.Pairs(identifier!, magnitudeOnly: true)[0].Distance < SeparationSearch.Pairs(identifier!)[0].Distance);
    }
}
