using System.Globalization;
using RangeReduce.Diagnostics;
using RangeReduce.Quantities;

namespace RangeReduce.Runs.Manifest;

/// <summary>Reads one <c>[[requirement]]</c> table.</summary>
internal static class RequirementReader
{
    private static readonly Quantity[] NotRequirable = [QuantityCatalogue.Deviation, QuantityCatalogue.ReflectionReal, QuantityCatalogue.ReflectionImaginary];

    /// <summary>Gives the requirement, or null where it is wrong; the errors are then noted.</summary>
    /// <param name="reader">The section.</param>
    /// <param name="number">Its number among the requirements, from 1.</param>
    public static Requirement? Read(SectionReader reader, int number)
    {
        var quantity = QuantityOf(reader);
        var unit = UnitText.DimensionOf(quantity?.Unit ?? string.Empty);
        var band = reader.Range("band", UnitDimension.Frequency);
        var cone = reader.Value("cone", UnitDimension.Angle)?.Value;
        var (state, otherState) = (reader.Text("state"), reader.Text("other-state"));
        var component = reader.Word("component", HandText.Components) ?? FieldComponent.None;

        // Bounds of an unknown quantity cannot be judged; asking for the entries only keeps the keys known.
        string[] bounds = ["at-least", "at-most", "between", "equals"];
        var given = bounds.Where(key => reader.Entry(key) is not null).ToArray();
        var hand = quantity == QuantityCatalogue.Hand;
        var (least, most, equal) = quantity is null || hand ? (null, null, hand ? reader.Word("equals", HandText.Hands) : null) : BoundsOf(reader, unit);
        reader.Finish();
        if (quantity is null)
        {
            return null;
        }

        var misplaced = given.Where(key => hand != (key is "equals")).ToArray();
        if (misplaced.Length > 0 || given.Length == 0 || (given.Length > 1 && given.Contains("between", StringComparer.Ordinal)))
        {
            var found = given.Length == 0 ? "a requirement without bound" : $"the bound {string.Join(" and ", given)} for {quantity}";
            reader.Complain(new(reader.Place, "bad-requirement", found, hand ? "equals, since a hand has no size" : "at-least, at-most, both of these, or between", "State the bound that is meant."));
            return null;
        }

        if (cone is < 0.0 or > 180.0)
        {
            reader.Complain(new(reader.Entry("cone")!.ValuePlace, "bad-value", "a cone outside 0 to 180 degrees", "the half angle of a cone about the axis", "Write for example cone = \"30 deg\"."));
        }

        if (least > most)
        {
            reader.Complain(new(reader.Place, "bad-requirement", "an at-least above the at-most", "bounds that leave room", "Exchange or correct them."));
        }

        return new()
        {
            Id = string.Create(CultureInfo.InvariantCulture, $"r{number}"),
            Quantity = quantity,
            State = state,
            OtherState = otherState,
            Component = component,
            BandLowHz = band?.Low,
            BandHighHz = band?.High,
            ConeDeg = cone,
            AtLeast = least,
            AtMost = most,
            EqualTo = equal,
            Line = reader.Place.Line,
        };
    }

    private static (double? Least, double? Most, Hand? Equal) BoundsOf(SectionReader reader, UnitDimension unit)
    {
        var between = reader.Range("between", unit);
        return (reader.Value("at-least", unit)?.Value ?? between?.Low, reader.Value("at-most", unit)?.Value ?? between?.High, null);
    }

    private static Quantity? QuantityOf(SectionReader reader)
    {
        if (reader.RequiredText("quantity", "axial-ratio") is not { } id)
        {
            return null;
        }

        var known = QuantityCatalogue.All.Except(NotRequirable);
        if (QuantityCatalogue.TryGet(id, out var quantity) && !NotRequirable.Contains(quantity))
        {
            return quantity;
        }

        reader.Complain(new MeasurementDataException(
            reader.Entry("quantity")!.ValuePlace, "unknown-quantity", FoundText.Show(id), "the id of a quantity that can be required", $"The nearest is \"{NearestName.Of(id, known.Select(entry => entry.Id))}\"."));
        return null;
    }
}
