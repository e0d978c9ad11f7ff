using System.Collections.Concurrent;
using RangeReduce.Diagnostics;
using RangeReduce.Networks;
using RangeReduce.Runs;

namespace RangeReduce.Comparison.Identification;

/// <summary>Tells from one reflection sweep in which configuration state an antenna is, or that it is in none of the known ones.</summary>
/// <remarks>A sweep of state k is taken as the signature of k, turned by a cable phase and delay, plus normal noise. The least squared distance over
/// the cable gives the likelihood of k; its tail probability under that model is the test against "none of them" (generalized likelihood ratio,
/// chi-square or Fisher's F). Without phase, magnitudes are compared with the mean and variance of the Rice distribution.</remarks>
public sealed class SweepIdentifier
{
    private readonly ConcurrentDictionary<(double[] Axis, bool HasPhase), (IdentificationPlan? Plan, string Reason)> _plans = new();

    private SweepIdentifier(IReadOnlyList<StateSignature> signatures, NoiseEstimate noise, IdentificationOptions options, IReadOnlyList<Remark> remarks)
    {
        (Signatures, Noise, Options, Remarks) = (signatures, noise, options, remarks);
    }

    /// <summary>Gets the signatures, in the order in which their states first came.</summary>
    public IReadOnlyList<StateSignature> Signatures { get; }

    /// <summary>Gets the noise that was stated or estimated.</summary>
    public NoiseEstimate Noise { get; }

    /// <summary>Gets how sweeps are identified.</summary>
    public IdentificationOptions Options { get; }

    /// <summary>Gets what was remarked while the signatures were made.</summary>
    public IReadOnlyList<Remark> Remarks { get; }

    /// <summary>Makes an identifier out of the sweeps of a run; several sweeps of one state are repeats.</summary>
    /// <param name="sweeps">The sweeps, all of one source.</param>
    /// <param name="identifier">The identifier; null where there is none.</param>
    /// <param name="reason">Why there is none, as a sentence; empty where there is one.</param>
    /// <param name="options">How to identify; null for the defaults.</param>
    /// <returns>Whether there is an identifier.</returns>
    public static bool TryBuild(IReadOnlyList<StateSweep> sweeps, out SweepIdentifier? identifier, out string reason, IdentificationOptions? options = null)
    {
        ArgumentNullException.ThrowIfNull(sweeps);
        options ??= new IdentificationOptions();
        identifier = null;
        reason = sweeps.Count == 0 ? "There is no sweep to make a signature of."
            : sweeps.Any(sweep => sweep.Source != sweeps[0].Source) ? "Signatures need sweeps of one source, measured or simulated."
            : sweeps.Any(sweep => !sweep.Sweep.Re.Concat(sweep.Sweep.Im).All(double.IsFinite)) ? "A sweep has a value that is not finite."
            : sweeps.Any(sweep => sweep.Sweep.Count < 2) ? "A sweep has fewer than 2 points."
            : string.Empty;
        if (reason.Length > 0)
        {
            return false;
        }

        var builder = new SignatureBuilder(options);
        var signatures = sweeps.GroupBy(sweep => sweep.State, StringComparer.Ordinal).Select(group => builder.Build(group.Key, [.. group])).ToArray();
        var noise = options.NoiseStandardDeviation is { } stated ? new NoiseEstimate(stated, double.PositiveInfinity, 1.0) : builder.Noise();
        reason = noise is null ? "No state has repeats and the noise was not stated, so nothing tells how far a sweep of a known state may lie from its signature."
            : !(noise.StandardDeviation > 0.0) ? "The noise is zero: the repeats are copies of each other, or it was stated so."
            : signatures.Any(signature => signature.ReferenceOhm != signatures[0].ReferenceOhm) ? "The states have different reference impedances."
            : string.Empty;
        if (reason.Length > 0)
        {
            return false;
        }

        foreach (var signature in signatures.Where(signature => signature.InterpolationError > 0.3 * noise!.StandardDeviation))
        {
            builder.Remarks.Add(new Remark(RemarkSeverity.Note, "coarse-signature", "The signature is sampled so coarsely that sweeps on another frequency axis may be called unknown.", State: signature.State));
        }

        identifier = new SweepIdentifier(signatures, noise!, options, builder.Remarks);
        return true;
    }

    /// <summary>Identifies one sweep.</summary>
    /// <param name="sweep">The sweep, on any frequency axis; its S11 is used.</param>
    public SweepIdentification Identify(NetworkSweep sweep)
    {
        ArgumentNullException.ThrowIfNull(sweep);
        return TryPlan(sweep, out var plan, out var reason) ? Run(plan!, sweep, plan!.MakeScratch()) : Refuse(reason);
    }

    /// <summary>Identifies many sweeps, on all cores.</summary>
    /// <param name="sweeps">The sweeps, on any frequency axes; sharing one axis array among sweeps saves time.</param>
    /// <param name="progress">Is told the number of sweeps done, now and then.</param>
    /// <param name="cancellation">Stops the work.</param>
    /// <returns>The answers, in the order of the sweeps.</returns>
    /// <exception cref="OperationCanceledException">The work was stopped.</exception>
    public IReadOnlyList<SweepIdentification> IdentifyAll(IReadOnlyList<NetworkSweep> sweeps, IProgress<int>? progress = null, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(sweeps);
        var answers = new SweepIdentification[sweeps.Count];
        if (sweeps.Count == 0)
        {
            return answers;
        }

        var done = 0;
        Parallel.ForEach(Partitioner.Create(0, sweeps.Count, 512), new ParallelOptions { CancellationToken = cancellation }, range =>
        {
            var (last, scratch) = (default(IdentificationPlan), default(IdentificationScratch));
            for (var n = range.Item1; n < range.Item2; n++)
            {
                if (!TryPlan(sweeps[n], out var plan, out var reason))
                {
                    answers[n] = Refuse(reason);
                    continue;
                }

                if (!ReferenceEquals(plan, last))
                {
                    (last, scratch) = (plan, plan!.MakeScratch());
                }

                answers[n] = Run(plan!, sweeps[n], scratch!);
            }

            progress?.Report(Interlocked.Add(ref done, range.Item2 - range.Item1));
        });
        return answers;
    }

    /// <summary>Says which frequencies decide the answer for one sweep.</summary>
    /// <param name="sweep">The sweep, on any frequency axis.</param>
    /// <returns>The evidence; null where the sweep is refused.</returns>
    public IdentificationEvidence? Explain(NetworkSweep sweep)
    {
        ArgumentNullException.ThrowIfNull(sweep);
        if (!TryPlan(sweep, out var plan, out _))
        {
            return null;
        }

        var scratch = plan!.MakeScratch();
        if (!plan.Measure(sweep, scratch))
        {
            return null;
        }

        var (best, second) = IdentificationPlan.Rank(scratch.LogLikelihood);
        var nearest = plan.PointDistances(scratch, best);
        var frequencyHz = plan.Axis.AsSpan(plan.First, plan.Count).ToArray();
        return IdentificationEvidence.Make(plan.Answer(scratch), frequencyHz, nearest, second < 0 ? null : plan.PointDistances(scratch, second));
    }

    private static SweepIdentification Run(IdentificationPlan plan, NetworkSweep sweep, IdentificationScratch scratch) =>
        plan.Measure(sweep, scratch) ? plan.Answer(scratch) : Refuse("The sweep has a value that is not finite.");

    private static SweepIdentification Refuse(string reason) => new() { Answer = IdentificationAnswer.Refused, Reason = reason };

    private bool TryPlan(NetworkSweep sweep, out IdentificationPlan? plan, out string reason)
    {
        plan = null;
        if (sweep.ReferenceOhm[0] != Signatures[0].ReferenceOhm)
        {
            reason = FormattableString.Invariant($"The sweep is referred to {sweep.ReferenceOhm[0]} ohm and the signatures to {Signatures[0].ReferenceOhm} ohm.");
            return false;
        }

        (plan, reason) = PlanFor(sweep);
        return plan is not null;
    }

    private (IdentificationPlan? Plan, string Reason) PlanFor(NetworkSweep sweep)
    {
        if (_plans.TryGetValue((sweep.FrequencyHz, sweep.HasPhase), out var known))
        {
            return known;
        }

        foreach (var (key, value) in _plans)
        {
            // A folder of files gives each sweep its own array of the same frequencies.
            if (key.HasPhase == sweep.HasPhase && ReflectionData.SameAxis(key.Axis, sweep.FrequencyHz))
            {
                return value;
            }
        }

        var made = IdentificationPlan.TryMake(sweep.FrequencyHz, sweep.HasPhase, Signatures, Noise, Options, out var plan, out var reason);
        return _plans.GetOrAdd((sweep.FrequencyHz, sweep.HasPhase), (made ? plan : null, reason));
    }
}
