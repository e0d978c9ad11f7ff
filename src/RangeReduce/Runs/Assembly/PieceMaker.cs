using RangeReduce.Diagnostics;
using RangeReduce.Patterns;
using RangeReduce.Quantities;
using RangeReduce.Runs.Manifest;
using RangeReduce.Runs.Planning;

namespace RangeReduce.Runs.Assembly;

/// <summary>Turns the channels of a file into components of the field: names, signs and time factor.</summary>
internal sealed class PieceMaker(ComponentMap map, TimeFactor time, List<Remark> remarks)
{
    /// <summary>Gets whether a channel was mapped by assumption.</summary>
    public bool UsedAssumed { get; private set; }

    /// <summary>Gets whether a channel was mapped by a heading that names the component.</summary>
    public bool UsedHeadings { get; private set; }

    /// <summary>Gives the pieces of one cut of a file: one for the linear and one for the circular components, where they are there.</summary>
    public IEnumerable<CutPiece> PiecesOf(PlannedFile file, RawCut raw)
    {
        if (FrequenciesOf(file, raw) is not { } frequencyHz)
        {
            yield break;
        }

        var fixedDeg = FixedAngleOf(file, raw);
        var channels = ComponentsOf(file, raw);
        foreach (var (basis, first, second) in new[] { (PolarizationBasis.ThetaPhi, FieldComponent.Theta, FieldComponent.Phi), (PolarizationBasis.RightLeft, FieldComponent.Right, FieldComponent.Left) })
        {
            if (!channels.ContainsKey(first) && !channels.ContainsKey(second))
            {
                continue;
            }

            var cut = new PatternCut
            {
                Axis = raw.Axis,
                FixedDeg = fixedDeg,
                FrequencyHz = frequencyHz,
                AngleDeg = raw.AngleDeg,
                Basis = basis,
                First = channels.GetValueOrDefault(first),
                Second = channels.GetValueOrDefault(second),
                Reference = raw.Reference,
            };
            yield return new([file.Input.Id], file.Input.Path, file.IsOfGainStandard ? null : file.Input.State, file.Input.Source ?? DataSource.Measured, cut);
        }
    }

    private Dictionary<FieldComponent, PatternChannel> ComponentsOf(PlannedFile file, RawCut raw)
    {
        var channels = new Dictionary<FieldComponent, PatternChannel>();
        foreach (var (name, samples) in raw.Channels)
        {
            var found = map.Of(name);
            if (found is not { } mapped)
            {
                Remark(file, RemarkSeverity.Fault, "unknown-channel", $"The channel {FoundText.Show(name)} is no component that is known here ({string.Join(", ", map.Known.Order(StringComparer.Ordinal))}), so it was left out. Name it under [probe] in run.toml.", raw.Lines.First);
            }
            else if (!channels.TryAdd(mapped.Component, Turned(samples, mapped.IsTurned)))
            {
                Remark(file, RemarkSeverity.Fault, "channel-twice", $"The channel {FoundText.Show(name)} is the component {HandText.Write(mapped.Component)}, which the file has already given; it was left out. Correct [probe] in run.toml.", raw.Lines.First);
            }
            else
            {
                UsedAssumed |= mapped.IsAssumed;
                UsedHeadings |= !mapped.IsAssumed;
                if (mapped.IsTurned && !samples.HasPhase)
                {
                    Remark(file, RemarkSeverity.Note, "sign-without-phase", $"The sign of {FoundText.Show(name)} cannot be turned: it was recorded without phase.", raw.Lines.First);
                }
            }
        }

        return channels;
    }

    private PatternChannel Turned(PatternChannel samples, bool isTurned)
    {
        if (samples.Im is null || (!isTurned && time == TimeFactor.PlusJ))
        {
            return samples;
        }

        // The conjugate turns the sign of the imaginary part, a reversed port that of both; together they leave it.
        var turnIm = isTurned != (time == TimeFactor.MinusI);
        return new(isTurned ? Negated(samples.Re) : samples.Re, turnIm ? Negated(samples.Im) : samples.Im);
    }

    private double[]? FrequenciesOf(PlannedFile file, RawCut raw)
    {
        if (!raw.FrequencyHz.Any(double.IsNaN))
        {
            return raw.FrequencyHz;
        }

        Remark(file, RemarkSeverity.Fault, "no-frequency", "The cut does not say its frequency, so it was left out. Add a frequency column, or write it in the file name, such as 1620MHz.", raw.Lines.First);
        return null;
    }

    private double FixedAngleOf(PlannedFile file, RawCut raw)
    {
        if (!double.IsNaN(raw.FixedDeg))
        {
            return raw.FixedDeg;
        }

        if (!file.IsOfGainStandard)
        {
            var angle = raw.Axis == CutAxis.Theta ? "phi" : "theta";
            Remark(file, RemarkSeverity.Doubt, "no-fixed-angle", $"The cut does not say at which {angle} it was taken. Add a column {angle}.", raw.Lines.First);
        }

        return double.NaN;
    }

    private static double[] Negated(double[] values) => Array.ConvertAll(values, value => -value);

    private void Remark(PlannedFile file, RemarkSeverity severity, string code, string text, int line)
    {
        var remark = new Remark(severity, code, text, new(file.Input.Path, line), file.Input.State);
        if (!remarks.Exists(known => string.Equals(known.Code, code, StringComparison.Ordinal) && string.Equals(known.Text, text, StringComparison.Ordinal) && string.Equals(known.Place?.File, file.Input.Path, StringComparison.Ordinal)))
        {
            remarks.Add(remark);
        }
    }
}
