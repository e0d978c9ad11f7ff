using System.Globalization;
using RangeReduce.Diagnostics;
using RangeReduce.Numerics;
using RangeReduce.Quantities;
using RangeReduce.Runs;

namespace RangeReduce.Reduction;

/// <summary>Holds the range against what it has to be: long enough for a far field, and steady over a turn.</summary>
public static class RangeAudit
{
    private const double LightSpeed = 299_792_458.0;

    // A turn that comes back to another level than this in dB, or twice the stated drift, has drifted (common practice).
    private const double ClosingDb = 0.2;

    // Nearer to the bottom of a null than this below the highest level a difference says nothing.
    private const double NullDb = 20.0;

    /// <summary>Adds the remarks.</summary>
    /// <param name="run">The run.</param>
    /// <param name="context">Where the remarks go.</param>
    public static void Add(MeasurementRun run, ReductionContext context)
    {
        ArgumentNullException.ThrowIfNull(run);
        ArgumentNullException.ThrowIfNull(context);
        var measured = run.Cuts.Where(cut => cut.Source == DataSource.Measured).ToArray();
        if (measured.Length > 0 && run.RangeLengthM is { } length)
        {
            FarField(length, run.LargestDimensionM, measured.Min(cut => cut.Cut.FrequencyHz[0]), measured.Max(cut => cut.Cut.FrequencyHz[^1]), context);
        }

        var drift = run.UncertaintyTerms.FirstOrDefault(term => term.Name is "drift")?.Value ?? 0.0;
        foreach (var cut in measured)
        {
            Closing(cut, Math.Max(ClosingDb, 2.0 * Math.Abs(drift)), context);
        }
    }

    // The three usual conditions (IEEE Std 149 for 2D²/λ; common practice for the other two).
    private static void FarField(double length, double? dimension, double lowestHz, double highestHz, ReductionContext context)
    {
        Require(10.0 * LightSpeed / lowestHz, "ten wavelengths at the lowest frequency");
        if (dimension is { } size)
        {
            Require(2.0 * size * size * highestHz / LightSpeed, "2D²/λ at the highest frequency");
            Require(10.0 * size, "ten times the largest dimension");
        }

        void Require(double least, string name)
        {
            if (length < least)
            {
                context.Remarks.Add(RemarkSeverity.Doubt, "near-field", string.Create(CultureInfo.InvariantCulture, $"The range of {length:0.###} m is shorter than {name}, {least:0.###} m: the far field is not reached, so nulls are filled and gain is low."), null);
            }
        }
    }

    private static void Closing(StateCut source, double limitDb, ReductionContext context)
    {
        var cut = source.Cut;
        var angles = cut.AngleDeg.Length;
        if (angles < 3 || Math.Abs(cut.AngleDeg[^1] - cut.AngleDeg[0] - 360.0) > 1e-6)
        {
            return;
        }

        for (var i = 0; i < cut.FrequencyHz.Length; i++)
        {
            var start = i * angles;
            var (first, last, top) = (Power(start), Power(start + angles - 1), 0.0);
            for (var k = 0; k < angles; k++)
            {
                top = Power(start + k) is var power && power > top ? power : top;
            }

            var difference = Math.Abs(Decibels.OfPower(first) - Decibels.OfPower(last));
            if (difference > limitDb && Decibels.OfPower(Math.Max(first, last)) > Decibels.OfPower(top) - NullDb)
            {
                context.Remarks.Add(RemarkSeverity.Doubt, "cut-not-closed", string.Create(CultureInfo.InvariantCulture, $"A cut of state {source.State} comes back after the whole turn to a level that differs by {difference:0.00} dB at {cut.FrequencyHz[i] / 1e9:0.####} GHz: drift, a loose joint or a moving cable."), source.State, context.PlaceOf(source.InputIds[0]));
                return;
            }
        }

        double Power(int at) => (cut.First?.Power(at) ?? 0.0) + (cut.Second?.Power(at) ?? 0.0);
    }
}
