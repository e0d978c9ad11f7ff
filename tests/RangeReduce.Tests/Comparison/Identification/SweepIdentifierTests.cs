using RangeReduce.Comparison.Identification;
using RangeReduce.Networks;
using RangeReduce.Quantities;
using RangeReduce.Runs;

namespace RangeReduce.Tests.Comparison.Identification;

/// <summary>Identification of sweeps whose true state, cable and noise are known.</summary>
public sealed class SweepIdentifierTests
{
    [Theory]
    [InlineData(0.0005, true)]
    [InlineData(0.002, true)]
    [InlineData(0.01, true)]
    [InlineData(0.03, true)]
    [InlineData(0.002, false)]
    [InlineData(0.01, false)]
    [InlineData(0.03, false)]
    public void Known_states_are_named_and_unseen_states_are_unknown_up_to_noise_30_dB_below_full_reflection(double noise, bool hasPhase)
    {
        var matrix = Confuse(noise, hasPhase);
        Assert.All(SyntheticAntenna.Known, state => Assert.InRange(matrix.Share(state, state), 0.99, 1.0));
        Assert.All(SyntheticAntenna.Known, state => Assert.Equal(0.0, matrix.Wrong(state), 1e-12));
        Assert.All(SyntheticAntenna.Unseen, state => Assert.Equal(1.0, matrix.Share(state, "Unknown")));
    }

    [Theory]
    [InlineData(true, 0.85)]
    [InlineData(false, 0.80)]
    public void With_noise_20_dB_below_full_reflection_mirror_states_become_ambiguous_rather_than_wrong(bool hasPhase, double leastRight)
    {
        // The two hands differ by 7 to 9 standard deviations there, all points together, and four noisy repeats make each signature.
        var matrix = Confuse(0.1, hasPhase);
        Assert.All(["left", "right"], state => Assert.InRange(matrix.Wrong(state), 0.0, 0.05));
        Assert.InRange(0.5 * (matrix.Share("left", "left") + matrix.Share("right", "right")), leastRight, 1.0);
        Assert.InRange(matrix.Share("left", "Ambiguous") + matrix.Share("right", "Ambiguous"), 0.02, 1.0);
        Assert.Equal(1.0, matrix.Share("half-deployed", "Unknown"));
        Assert.InRange(matrix.Share("stowed", "stowed"), 0.99, 1.0);
    }

    [Theory]
    [InlineData(0.0, 4, true, 0.05)]
    [InlineData(0.0, 4, false, 0.05)]
    [InlineData(0.0, 2, true, 0.05)]
    [InlineData(0.8, 8, true, 0.05)]
    [InlineData(0.95, 4, true, 0.05)]
    public void The_false_alarm_rate_is_the_stated_one_for_white_and_for_correlated_scatter(double correlation, int repeats, bool hasPhase, double rate)
    {
        var (alarms, total) = (0, 0);
        for (var seed = 0; seed < 20; seed++)
        {
            var antenna = new SyntheticAntenna(seed);
            var identifier = Build(antenna.Run(repeats, 0.005, correlation: correlation), new IdentificationOptions { FalseAlarmRate = rate });
            NetworkSweep[] taken = [.. Enumerable.Range(0, 300).Select(n => antenna.Sweep(SyntheticAntenna.Known[n % 3], 0.005, hasPhase: hasPhase, correlation: correlation))];
            var answers = identifier.IdentifyAll(taken);
            (alarms, total) = (alarms + answers.Count(answer => answer.Answer == IdentificationAnswer.Unknown), total + answers.Count);
        }

        Assert.InRange((double)alarms / total, 0.5 * rate, 1.6 * rate);
    }

    [Fact]
    public void The_noise_is_estimated_from_repeats_although_each_has_another_cable()
    {
        var identifier = Build(new SyntheticAntenna(3).Run(5, 0.004));
        Assert.Equal(0.004, identifier.Noise.StandardDeviation, 0.0001);
        Assert.InRange(identifier.Noise.Correlation, 1.0, 1.7);
    }

    [Fact]
    public void A_cable_is_found_with_its_delay_and_changes_no_answer()
    {
        var antenna = new SyntheticAntenna(4);
        var identifier = Build(antenna.Run(3, 0.002));
        var sweep = antenna.Sweep("right", 0.002, cableSeconds: 0.0);
        var turned = WithCable(sweep, 7.3e-9);
        var (plain, cabled) = (identifier.Identify(sweep), identifier.Identify(turned));
        Assert.Equal("right", cabled.State);
        Assert.Equal(7.3e-9, cabled.DelaySeconds - plain.DelaySeconds, 1e-12);
        Assert.Equal(plain.RmsDistance, cabled.RmsDistance, 1e-8);
        Assert.Equal(plain.LogLikelihoodRatio, cabled.LogLikelihoodRatio, 1e-3 * plain.LogLikelihoodRatio);
    }

    [Fact]
    public void With_the_plane_fixed_a_cable_makes_the_sweep_unknown()
    {
        var antenna = new SyntheticAntenna(4);
        StateSweep[] run = [.. from state in SyntheticAntenna.Known from n in Enumerable.Range(0, 3) select new StateSweep($"i{n}", state, DataSource.Measured, antenna.Sweep(state, 0.002, cableSeconds: 0.0))];
        var identifier = Build(run, new IdentificationOptions { CablePhase = CablePhase.Fixed });
        var sweep = antenna.Sweep("left", 0.002, cableSeconds: 0.0);
        Assert.Equal("left", identifier.Identify(sweep).State);
        Assert.Equal(IdentificationAnswer.Unknown, identifier.Identify(WithCable(sweep, 0.2e-9)).Answer);
    }

    [Fact]
    public void The_delay_that_was_found_is_the_best_of_a_fine_search()
    {
        // The Newton search against plain enumeration of the delay, for the true and for a wrong state.
        var antenna = new SyntheticAntenna(8);
        var sweep = antenna.Sweep("left", 0.01);
        foreach (var state in SyntheticAntenna.Known)
        {
            var identifier = Build([new StateSweep("i1", state, DataSource.Measured, antenna.Sweep(state, 0.0, cableSeconds: 0.0))], new IdentificationOptions { NoiseStandardDeviation = 0.01 });
            var coarse = Enumerable.Range(-1000, 2001).MinBy(n => DistanceAt(sweep, state, n * 1e-11)) * 1e-11;
            var least = Enumerable.Range(-1000, 2001).Min(n => DistanceAt(sweep, state, coarse + (n * 1e-14)));
            Assert.Equal(Math.Sqrt(least / sweep.Count), identifier.Identify(sweep).RmsDistance, 1e-6);
        }
    }

    [Fact]
    public void A_sweep_on_another_axis_and_of_two_ports_is_identified()
    {
        var antenna = new SyntheticAntenna(6);
        var identifier = Build(antenna.Run(4, 0.003));
        double[] axis = [.. Enumerable.Range(0, 173).Select(n => 1.1e9 + (5.1e6 * n))];
        var one = antenna.Sweep("right", 0.003, axis);
        var (re, im) = (new double[axis.Length * 4], new double[axis.Length * 4]);
        for (var n = 0; n < axis.Length; n++)
        {
            (re[4 * n], im[4 * n], re[(4 * n) + 3]) = (one.Re[n], one.Im[n], 0.5);
        }

        var answer = identifier.Identify(new NetworkSweep(axis, 2, [50.0, 50.0], re, im));
        Assert.Equal("right", answer.State);
        Assert.Equal(identifier.Identify(one), answer);
        Assert.Equal(axis.Count(hz => hz >= 1.2e9), answer.Count);
        Assert.True(answer.Resampled);
        Assert.False(identifier.Identify(antenna.Sweep("right", 0.003)).Resampled);
        Assert.Empty(identifier.Remarks);
    }

    [Fact]
    public void A_logarithmic_axis_gives_the_answer_and_the_delay_of_a_uniform_one()
    {
        var antenna = new SyntheticAntenna(14);
        var identifier = Build(antenna.Run(4, 0.003));
        double[] axis = [.. Enumerable.Range(0, 350).Select(n => 1.2e9 * Math.Pow(2.2 / 1.2, n / 349.0))];
        var sweep = antenna.Sweep("left", 0.003, axis, cableSeconds: 0.0);
        var (plain, cabled) = (identifier.Identify(sweep), identifier.Identify(WithCable(sweep, -4.1e-9)));
        Assert.Equal("left", cabled.State);
        Assert.Equal(-4.1e-9, cabled.DelaySeconds - plain.DelaySeconds, 1e-12);
        Assert.Equal(plain.RmsDistance, cabled.RmsDistance, 1e-8);
    }

    [Fact]
    public void Too_small_an_overlap_another_impedance_and_a_gap_are_refused_with_a_reason()
    {
        var antenna = new SyntheticAntenna(6);
        var identifier = Build(antenna.Run(4, 0.003));
        double[] narrow = [.. Enumerable.Range(0, 200).Select(n => 1.5e9 + (2.5e6 * n))];
        double[] sparse = [.. Enumerable.Range(0, 21).Select(n => 1.2e9 + (50e6 * n))];
        double[] axis = SyntheticAntenna.Axis;
        var gap = new double[axis.Length];
        gap[7] = double.NaN;
        Assert.Contains("% of the band", identifier.Identify(antenna.Sweep("left", 0.003, narrow)).Reason, StringComparison.Ordinal);
        Assert.Contains("32 are needed", identifier.Identify(antenna.Sweep("left", 0.003, sparse)).Reason, StringComparison.Ordinal);
        Assert.Contains("75 ohm", identifier.Identify(new NetworkSweep(axis, 1, [75.0], gap, gap)).Reason, StringComparison.Ordinal);
        Assert.Contains("not finite", identifier.Identify(new NetworkSweep(axis, 1, [50.0], gap, gap)).Reason, StringComparison.Ordinal);
        Assert.Null(identifier.Explain(new NetworkSweep(axis, 1, [50.0], gap, gap)));
    }

    [Fact]
    public void Two_states_with_one_reflection_are_ambiguous()
    {
        var antenna = new SyntheticAntenna(9);
        StateSweep[] run = [.. antenna.Run(4, 0.003), .. Enumerable.Range(0, 4).Select(n => new StateSweep($"t{n}", "twin of right", DataSource.Measured, antenna.Sweep("right", 0.003)))];
        var answers = Build(run).IdentifyAll([.. Enumerable.Range(0, 50).Select(_ => antenna.Sweep("right", 0.003))]);
        Assert.All(answers, answer => Assert.Contains("right", answer.Nearest, StringComparison.Ordinal));
        Assert.InRange(answers.Count(answer => answer.Answer == IdentificationAnswer.Ambiguous), 10, 50);
    }

    [Fact]
    public void Without_repeats_and_without_stated_noise_there_is_no_identifier()
    {
        var single = new SyntheticAntenna(2).Run(1, 0.003);
        Assert.False(SweepIdentifier.TryBuild(single, out _, out var reason));
        Assert.Contains("noise was not stated", reason, StringComparison.Ordinal);
        Assert.Equal("stowed", Build(single, new IdentificationOptions { NoiseStandardDeviation = 0.003 }).Identify(new SyntheticAntenna(1).Sweep("stowed", 0.003)).State);
        Assert.False(SweepIdentifier.TryBuild([single[0], single[1] with { Source = DataSource.Simulated }], out _, out reason));
        Assert.Contains("one source", reason, StringComparison.Ordinal);
        Assert.False(SweepIdentifier.TryBuild([single[0], single[0]], out _, out reason));
        Assert.Contains("copies", reason, StringComparison.Ordinal);
    }

    [Fact]
    public void A_repeat_on_another_axis_is_left_out_with_a_remark()
    {
        var antenna = new SyntheticAntenna(2);
        StateSweep[] run = [.. antenna.Run(2, 0.003), new StateSweep("odd", "left", DataSource.Measured, antenna.Sweep("left", 0.003, [1e9, 2e9, 3e9]))];
        var identifier = Build(run);
        Assert.Equal(2, identifier.Signatures.Single(signature => string.Equals(signature.State, "left", StringComparison.Ordinal)).Repeats);
        Assert.Contains(identifier.Remarks, remark => remark.Text.Contains("odd", StringComparison.Ordinal));
    }

    [Fact]
    public void A_signature_too_coarse_to_be_interpolated_is_remarked()
    {
        var antenna = new SyntheticAntenna(2);
        double[] axis = [.. Enumerable.Range(0, 41).Select(n => 1.2e9 + (25e6 * n))];
        StateSweep[] run = [.. Enumerable.Range(0, 4).Select(n => new StateSweep($"i{n}", "right", DataSource.Measured, antenna.Sweep("right", 1e-4, axis)))];
        Assert.Contains(Build(run).Remarks, remark => string.Equals(remark.Code, "coarse-signature", StringComparison.Ordinal));
    }

    [Fact]
    public void The_deciding_frequencies_lie_where_the_states_differ()
    {
        var antenna = new SyntheticAntenna(12);
        var identifier = Build(antenna.Run(4, 0.003));
        var evidence = identifier.Explain(antenna.Sweep("right", 0.003))!;
        Assert.Equal("right", evidence.Identification.State);
        Assert.Equal("left", evidence.Identification.RunnerUp);
        Assert.InRange(evidence.DecidingLowHz, 1.55e9, 1.70e9);
        Assert.InRange(evidence.DecidingHighHz, 1.55e9, 1.70e9);
        Assert.All(evidence.DecidingHz, hz => Assert.InRange(hz, 1.54e9, 1.71e9));
        Assert.Equal(evidence.Identification.LogLikelihoodRatio, evidence.Lead.Sum(), 1e-6 * evidence.Identification.LogLikelihoodRatio);
        Assert.Equal(1.0 / identifier.Noise.Correlation, evidence.Misfit.Average(), 0.2);
    }

    [Fact]
    public void Many_sweeps_at_once_give_the_answers_of_each_alone()
    {
        var antenna = new SyntheticAntenna(5);
        var identifier = Build(antenna.Run(4, 0.01));
        NetworkSweep[] distinct = [.. Enumerable.Range(0, 900).Select(n => antenna.Sweep(SyntheticAntenna.Known[n % 3], 0.01))];
        NetworkSweep[] sweeps = [.. Enumerable.Range(0, 10_000).Select(n => distinct[n % 900])];
        var answers = identifier.IdentifyAll(sweeps);
        Assert.InRange(answers.Where((answer, n) => string.Equals(answer.State, SyntheticAntenna.Known[n % 3], StringComparison.Ordinal)).Count(), 9_950, 10_000);
        Assert.Equal(identifier.Identify(sweeps[77]), answers[77]);
    }

    [Fact]
    public void Many_sweeps_can_be_stopped()
    {
        var antenna = new SyntheticAntenna(5);
        using var source = new CancellationTokenSource();
        source.Cancel();
        Assert.Throws<OperationCanceledException>(() => Build(antenna.Run(2, 0.01)).IdentifyAll([antenna.Sweep("left", 0.01)], cancellation: source.Token));
    }

    private static SweepIdentifier Build(IReadOnlyList<StateSweep> run, IdentificationOptions? options = null)
    {
        Assert.True(SweepIdentifier.TryBuild(run, out var identifier, out var reason, options), reason);
        return identifier!;
    }

    private static ConfusionMatrix Confuse(double noise, bool hasPhase)
    {
        var antenna = new SyntheticAntenna(11);
        var identifier = Build(antenna.Run(4, noise));
        var matrix = new ConfusionMatrix();
        foreach (var state in SyntheticAntenna.Known.Concat(SyntheticAntenna.Unseen))
        {
            NetworkSweep[] taken = [.. Enumerable.Range(0, 400).Select(_ => antenna.Sweep(state, noise, hasPhase: hasPhase))];
            foreach (var answer in identifier.IdentifyAll(taken))
            {
                matrix.Add(state, answer);
            }
        }

        return matrix;
    }

    private static NetworkSweep WithCable(NetworkSweep sweep, double seconds)
    {
        var (re, im) = (new double[sweep.Count], new double[sweep.Count]);
        for (var n = 0; n < sweep.Count; n++)
        {
            var value = sweep[n, 0, 0] * System.Numerics.Complex.FromPolarCoordinates(1.0, -2.0 * Math.PI * sweep.FrequencyHz[n] * seconds);
            (re[n], im[n]) = (value.Real, value.Imaginary);
        }

        return new NetworkSweep(sweep.FrequencyHz, 1, [50.0], re, im);
    }

    private static double DistanceAt(NetworkSweep sweep, string state, double seconds)
    {
        var (product, energy) = (System.Numerics.Complex.Zero, 0.0);
        for (var n = 0; n < sweep.Count; n++)
        {
            var (x, g) = (sweep[n, 0, 0], SyntheticAntenna.Reflection(state, sweep.FrequencyHz[n]));
            product += x * System.Numerics.Complex.Conjugate(g) * System.Numerics.Complex.FromPolarCoordinates(1.0, 2.0 * Math.PI * sweep.FrequencyHz[n] * seconds);
            energy += Math.Pow(x.Magnitude, 2.0) + Math.Pow(g.Magnitude, 2.0);
        }

        return energy - (2.0 * product.Magnitude);
    }
}
