using RangeReduce.Diagnostics;

namespace RangeReduce.Networks.Touchstone;

/// <summary>Collects frequencies and matrices into growing planar arrays.</summary>
/// <param name="options">Limits.</param>
/// <param name="layout">Where the pairs of a record go.</param>
/// <param name="ports">Number of ports.</param>
/// <param name="format">How a pair makes a complex value.</param>
internal sealed class SweepStore(TouchstoneOptions options, MatrixLayout layout, int ports, ParameterFormat format)
{
    private double[] _frequency = new double[64];
    private double[] _re = new double[64 * ports * ports];
    private double[] _im = new double[64 * ports * ports];
    private int _lineBefore;

    /// <summary>Gets the number of frequencies.</summary>
    public int Count { get; private set; }

    /// <summary>Gets how many records were taken, repeated ones included.</summary>
    public int Records { get; private set; }

    /// <summary>Gets the last frequency in hertz; −1 before the first.</summary>
    public double LastHz => Count == 0 ? -1.0 : _frequency[Count - 1];

    /// <summary>Gets whether a magnitude was negative.</summary>
    public bool HasNegativeMagnitude { get; private set; }

    /// <summary>Takes a record.</summary>
    /// <param name="numbers">Frequency in hertz, then the pairs; they are changed.</param>
    /// <param name="place">Place of the record.</param>
    /// <returns>False where the point repeats the one before it value by value and was left out.</returns>
    /// <exception cref="MeasurementDataException">The frequency does not rise, a level is too high for a number, or there is too much.</exception>
    public bool TryAdd(Span<double> numbers, SourcePlace place)
    {
        var frequency = numbers[0];
        if (frequency < 0.0)
        {
            throw TouchstoneErrors.BadFrequency(place, FormattableString.Invariant($"{frequency:R} Hz"));
        }

        if (frequency < LastHz)
        {
            throw TouchstoneErrors.FrequencyNotIncreasing(place, frequency, LastHz, _lineBefore);
        }

        var cells = ports * ports;
        if ((Count + 1L) * cells > options.MostValues)
        {
            throw TouchstoneErrors.TooMuch(place, FormattableString.Invariant($"more than {options.MostValues} values"), "fewer");
        }

        if (Count == _frequency.Length)
        {
            Array.Resize(ref _frequency, 2 * Count);
            Array.Resize(ref _re, 2 * Count * cells);
            Array.Resize(ref _im, 2 * Count * cells);
        }

        var pairs = numbers[1..];
        Records++;
        ToRealImaginary(pairs, place);
        var re = _re.AsSpan(Count * cells, cells);
        var im = _im.AsSpan(Count * cells, cells);
        layout.Spread(pairs, re, im);
        if (frequency == LastHz)
        {
            var before = (Count - 1) * cells;
            return re.SequenceEqual(_re.AsSpan(before, cells)) && im.SequenceEqual(_im.AsSpan(before, cells))
                ? false
                : throw TouchstoneErrors.FrequencyNotIncreasing(place, frequency, LastHz, _lineBefore);
        }

        _frequency[Count++] = frequency;
        _lineBefore = place.Line;
        return true;
    }

    /// <summary>Gives the arrays, cut to size.</summary>
    public (double[] FrequencyHz, double[] Re, double[] Im) Take()
    {
        var cells = Count * ports * ports;
        Array.Resize(ref _frequency, Count);
        Array.Resize(ref _re, cells);
        Array.Resize(ref _im, cells);
        return (_frequency, _re, _im);
    }

    private void ToRealImaginary(Span<double> pairs, SourcePlace place)
    {
        if (format == ParameterFormat.RealImaginary)
        {
            return;
        }

        for (var i = 0; i + 1 < pairs.Length; i += 2)
        {
            var magnitude = format == ParameterFormat.DecibelAngle ? Math.Pow(10.0, pairs[i] / 20.0) : pairs[i];
            if (!double.IsFinite(magnitude))
            {
                throw TouchstoneErrors.BadNumber(place, FormattableString.Invariant($"a level of {pairs[i]} dB"));
            }

            HasNegativeMagnitude |= magnitude < 0.0;
            var (sin, cos) = double.SinCosPi(pairs[i + 1] / 180.0);
            (pairs[i], pairs[i + 1]) = (magnitude * cos, magnitude * sin);
        }
    }
}
