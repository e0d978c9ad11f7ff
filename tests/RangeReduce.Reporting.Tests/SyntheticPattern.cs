using System.Numerics;

using RangeReduce.Quantities;

namespace RangeReduce.Reporting.Tests;

/// <summary>Cuts of a broad circularly polarized beam.</summary>
internal static class SyntheticPattern
{
    public static readonly double[] Frequencies = [.. Enumerable.Range(0, 11).Select(at => 1.52e9 + (at * 0.02e9))];
    public static readonly double[] Angles = [.. Enumerable.Range(0, 181).Select(at => -180.0 + (2.0 * at))];

    private static readonly double[] Phis = [0.0, 45.0, 90.0];

    public static void Add(FigureTable table, string state, DataSource source)
    {
        foreach (var phi in Phis)
        {
            var axis = Frequencies.Select(frequency => AddCut(table, state, source, frequency, phi)).ToList();
            void Over(Quantity quantity, FieldComponent component, Func<(Complex Right, Complex Left), double> value, FigurePlace at) => table.Add(new Trace
            {
                Quantity = quantity,
                Axis = TraceAxis.Frequency,
                X = Frequencies,
                Y = [.. axis.Select(value)],
                State = state,
                Source = source,
                PhiDeg = phi,
                Component = component,
                At = at,
            });
            Over(QuantityCatalogue.Gain, FieldComponent.Right, field => SyntheticRun.DecibelsOf(field.Right), FigurePlace.Axis);
            Over(QuantityCatalogue.Gain, FieldComponent.Left, field => SyntheticRun.DecibelsOf(field.Left), FigurePlace.Axis);
            Over(QuantityCatalogue.AxialRatio, FieldComponent.None, AxialRatio, FigurePlace.Axis);
            Over(QuantityCatalogue.CrossPolarRatio, FieldComponent.None, field => Math.Abs(SyntheticRun.DecibelsOf(field.Right) - SyntheticRun.DecibelsOf(field.Left)), FigurePlace.Axis);
            if (state is not "stowed")
            {
                Over(QuantityCatalogue.HalfPowerBeamwidth, FieldComponent.Total, field => 70.0 + (phi / 30.0) + (0.3 * SyntheticRun.DecibelsOf(field.Right)), FigurePlace.None);
            }
        }
    }

    private static (Complex Right, Complex Left) AddCut(FigureTable table, string state, DataSource source, double frequency, double phi)
    {
        var fields = Array.ConvertAll(Angles, angle => Field(state, source, frequency, phi, angle));
        void Along(Quantity quantity, FieldComponent component, Func<(Complex Right, Complex Left), double> value) => table.Add(new Trace
        {
            Quantity = quantity,
            Axis = TraceAxis.Angle,
            X = Angles,
            Y = Array.ConvertAll(fields, field => value(field)),
            State = state,
            Source = source,
            FrequencyHz = frequency,
            PhiDeg = phi,
            Component = component,
        });
        Along(QuantityCatalogue.Gain, FieldComponent.Right, field => SyntheticRun.DecibelsOf(field.Right));
        Along(QuantityCatalogue.Gain, FieldComponent.Left, field => SyntheticRun.DecibelsOf(field.Left));
        Along(QuantityCatalogue.Gain, FieldComponent.Total, Total);
        Along(QuantityCatalogue.AxialRatio, FieldComponent.None, AxialRatio);
        Along(QuantityCatalogue.TiltAngle, FieldComponent.None, Tilt);
        AddFigures(table, state, source, frequency, phi, fields);
        return fields[90];
    }

    private static void AddFigures(FigureTable table, string state, DataSource source, double frequency, double phi, (Complex Right, Complex Left)[] fields)
    {
        var measured = source == DataSource.Measured;
        void Put(Quantity quantity, double value, FigurePlace at, FieldComponent component = FieldComponent.None, double? expanded = null, double? direction = null, string? why = null, double? threshold = null) => table.Add(new Figure
        {
            Quantity = quantity,
            Value = value,
            State = state,
            Source = source,
            FrequencyHz = frequency,
            PhiDeg = phi,
            At = at,
            Component = component,
            DirectionDeg = direction,
            Why = why,
            Threshold = threshold,
            Uncertainty = measured && expanded is { } known ? SyntheticRun.Known(known, ("gain-standard", 0.125), ("reflectivity", 0.0874)) : Uncertainty.None,
        });
        var axis = fields[90];
        Put(QuantityCatalogue.Gain, SyntheticRun.DecibelsOf(axis.Right), FigurePlace.Axis, FieldComponent.Right, 0.51);
        Put(QuantityCatalogue.Gain, SyntheticRun.DecibelsOf(axis.Left), FigurePlace.Axis, FieldComponent.Left, 0.51);
        Put(QuantityCatalogue.Gain, Total(axis), FigurePlace.Axis, FieldComponent.Total, 0.51);
        Put(QuantityCatalogue.Gain, fields.Max(Total), FigurePlace.Peak, FieldComponent.Total, 0.48, 2.0);
        Put(QuantityCatalogue.AxialRatio, AxialRatio(axis), FigurePlace.Axis, expanded: 0.38);
        Put(QuantityCatalogue.TiltAngle, Tilt(axis), FigurePlace.Axis);
        Put(QuantityCatalogue.CrossPolarRatio, Math.Abs(SyntheticRun.DecibelsOf(axis.Right) - SyntheticRun.DecibelsOf(axis.Left)), FigurePlace.Axis);
        if (state is not "stowed")
        {
            table.Add(new Figure { Quantity = QuantityCatalogue.Hand, Hand = axis.Right.Magnitude > axis.Left.Magnitude ? Hand.Right : Hand.Left, State = state, Source = source, FrequencyHz = frequency, PhiDeg = phi, At = FigurePlace.Axis });
            Put(QuantityCatalogue.PeakDirection, -0.4, FigurePlace.None);
            Put(QuantityCatalogue.HalfPowerBeamwidth, 71.3 + (phi / 30.0), FigurePlace.None, FieldComponent.Total, measured ? 1.4 : null);
            Put(QuantityCatalogue.SidelobeLevel, -14.2, FigurePlace.None);
            Put(QuantityCatalogue.AxialRatioBeamwidth, 88.0 - (phi / 9.0), FigurePlace.None, threshold: 3.0);
        }

        Put(QuantityCatalogue.FrontToBackRatio, state is "stowed" ? double.NaN : 17.8, FigurePlace.None, why: state is "stowed" ? "The cut has no main lobe above the noise floor." : null);
    }

    private static (Complex Right, Complex Left) Field(string state, DataSource source, double frequency, double phi, double angle)
    {
        var half = double.DegreesToRadians(angle) / 2.0;
        var beam = Math.Pow(Math.Abs(Math.Cos(half)), 3.2) + (0.05 * Math.Abs(Math.Sin(3.0 * half)));
        var level = state is "stowed" ? 0.05 : 2.45 - (0.4 * Math.Abs(frequency - 1.62e9) / 0.1e9);
        var turn = Complex.Exp(new Complex(0.0, double.DegreesToRadians((2.0 * phi) + (angle * 1.3))));
        var leak = 0.09 + (2.2e-9 * Math.Abs(frequency - 1.614e9) * 0.5) + (0.55 * Math.Pow(Math.Abs(Math.Sin(half)), 2.0));
        var noise = source == DataSource.Measured ? 0.012 * Math.Cos((angle * 0.21) + phi + (frequency * 1e-8)) : 0.0;
        var (co, cross) = (new Complex(level * (beam + noise), 0.0), level * ((leak * (beam + 0.03)) + Math.Abs(noise)) * turn);
        return state is "left" ? (cross, co) : (co, cross);
    }

    private static double Total((Complex Right, Complex Left) field) => 10.0 * Math.Log10(Math.Pow(field.Right.Magnitude, 2.0) + Math.Pow(field.Left.Magnitude, 2.0));

    private static double AxialRatio((Complex Right, Complex Left) field)
    {
        var (right, left) = (field.Right.Magnitude, field.Left.Magnitude);
        return 20.0 * Math.Log10((right + left) / Math.Max(1e-4, Math.Abs(right - left)));
    }

    private static double Tilt((Complex Right, Complex Left) field) => double.RadiansToDegrees((field.Left / field.Right).Phase / 2.0);
}
