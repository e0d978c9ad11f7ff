using System.Globalization;
using RangeReduce.Diagnostics;

namespace RangeReduce.Patterns.Tables;

/// <summary>Finds the frequency and the two angles of a table: as a column, across the headings, in the preamble, in the options or in the file name.</summary>
internal static class KeyPlanner
{
    private static readonly HeadingKind[] FirstKinds = [HeadingKind.Theta, HeadingKind.Azimuth, HeadingKind.Angle, HeadingKind.Elevation];
    private static readonly HeadingKind[] SecondKinds = [HeadingKind.Phi, HeadingKind.Roll, HeadingKind.Elevation];

    /// <summary>Plans the three keys.</summary>
    /// <exception cref="MeasurementDataException">A frequency has no unit, or there are more angles than a cut can have.</exception>
    public static TableKey[] Plan(TableContext context, Heading[] headings)
    {
        var frequency = ColumnOf(context, headings, heading => heading.Kind == HeadingKind.Frequency, "frequency");
        var across = Array.Find(headings, heading => heading.IsAcross);
        if (frequency >= 0 && headings[frequency].Unit.Kind != UnitKind.Frequency)
        {
            throw TableFaults.FrequencyUnit(context.HeadingPlace(frequency), headings[frequency].Text);
        }

        var kinds = headings.Where(heading => heading.IsAngle).Select(heading => heading.Kind).Concat(across is { AcrossKind: not HeadingKind.Frequency } ? [across.AcrossKind] : []).Distinct().ToList();
        if (kinds.Count > 2)
        {
            throw TableFaults.TooManyAngles(context.HeadingsPlace, headings.Where(heading => heading.IsAngle).Select(heading => heading.Text));
        }

        var (first, second) = Slots(context, kinds);
        return
        [
            frequency >= 0 ? new() { Kind = HeadingKind.Frequency, Column = frequency, Factor = headings[frequency].Unit.Factor } : FrequencyElsewhere(context, across),
            AngleKey(context, headings, first, across, isSecond: false),
            AngleKey(context, headings, second, across, isSecond: true),
        ];
    }

    private static (HeadingKind First, HeadingKind Second) Slots(TableContext context, List<HeadingKind> kinds)
    {
        var first = FirstKinds.FirstOrDefault(kinds.Contains);
        var second = SecondKinds.FirstOrDefault(kind => kind != first && kinds.Contains(kind));
        var left = kinds.Where(kind => kind != first && kind != second).ToArray();
        return left.Length == 0 ? (first, second) : throw TableFaults.TooManyAngles(context.HeadingsPlace, kinds.Select(kind => kind.ToString()));
    }

    private static int ColumnOf(TableContext context, Heading[] headings, Predicate<Heading> test, string meaning)
    {
        var at = Array.FindIndex(headings, test);
        var next = at < 0 ? -1 : Array.FindIndex(headings, at + 1, test);
        return next < 0 ? at : throw TableFaults.Twice(context.HeadingPlace(next), headings[next].Text, headings[at].Text, meaning);
    }

    private static TableKey FrequencyElsewhere(TableContext context, Heading? across)
    {
        if (across is { AcrossKind: HeadingKind.Frequency })
        {
            return new() { Kind = HeadingKind.Frequency, IsAcross = true };
        }

        var named = NameHints.FrequencyHz(Path.GetFileName(context.File));
        if (context.MetadataOf(HeadingKind.Frequency) is { } entry)
        {
            var fallback = entry.KeyUnit;
            if (fallback.Kind == UnitKind.None && context.Metadata("frequency unit", "frequency units", "freq unit") is { } unit)
            {
                _ = HeadingUnit.TryParse(unit, out fallback);
            }

            if (!MetadataLine.TryQuantity(entry.Value, UnitKind.Frequency, fallback, out var value) || value <= 0.0)
            {
                throw TableFaults.FrequencyInPreamble(context.File, entry.Value);
            }

            Contradicts(context, "frequency", value / 1e6, named / 1e6, "MHz");
            return new() { Kind = HeadingKind.Frequency, Fixed = value };
        }

        if (!double.IsNaN(context.Options.FrequencyHz))
        {
            return new() { Kind = HeadingKind.Frequency, Fixed = context.Options.FrequencyHz };
        }

        if (!double.IsNaN(named))
        {
            context.Note("frequency-from-name", string.Create(CultureInfo.InvariantCulture, $"The frequency {named / 1e6:0.######} MHz was taken from the name of the file."), new SourcePlace(context.File));
        }

        return new() { Kind = HeadingKind.Frequency, Fixed = named };
    }

    private static TableKey AngleKey(TableContext context, Heading[] headings, HeadingKind kind, Heading? across, bool isSecond)
    {
        if (kind == HeadingKind.Unknown)
        {
            return AngleElsewhere(context, headings, isSecond);
        }

        var column = ColumnOf(context, headings, heading => heading.Kind == kind, kind.ToString().ToLowerInvariant());
        if (column < 0)
        {
            return new() { Kind = kind, IsAcross = true };
        }

        if (across is not null && across.AcrossKind == kind)
        {
            throw TableFaults.Twice(context.HeadingPlace(column), headings[column].Text, across.Text, "angle");
        }

        var unit = headings[column].Unit;
        if (unit.Kind == UnitKind.None)
        {
            context.Note("angle-unit", $"The column \"{headings[column].Text}\" has no unit and was read in degrees.", context.HeadingPlace(column));
        }

        return new() { Kind = kind, Column = column, Factor = unit.Kind == UnitKind.Angle ? unit.Factor : 1.0 };
    }

    /// <summary>Finds the fixed angle that no column gives.</summary>
    private static TableKey AngleElsewhere(TableContext context, Heading[] headings, bool isSecond)
    {
        // Without any angle column the theta-like key stays open, unless the preamble or the name fixes it.
        HeadingKind[] kinds = isSecond ? [HeadingKind.Phi, HeadingKind.Roll] : [HeadingKind.Theta];
        var isAzimuth = Array.Exists(headings, heading => heading.Kind == HeadingKind.Azimuth);
        kinds = isSecond && isAzimuth ? [.. kinds, HeadingKind.Elevation] : kinds;
        var hints = NameHints.Angles(Path.GetFileName(context.File)).Where(hint => kinds.Contains(hint.Kind)).ToArray();
        var named = hints.Select(hint => hint.Deg).Distinct().Count() == 1 ? hints[0].Deg : double.NaN;
        foreach (var kind in kinds)
        {
            if (FixedInPreamble(context, kind) is { } value)
            {
                Contradicts(context, kind.ToString().ToLowerInvariant(), value, hints.Length > 0 && hints[0].Kind == kind ? named : double.NaN, "degrees");
                return new() { Kind = kind, Fixed = value };
            }
        }

        var isFixed = isSecond || Array.Exists(headings, heading => heading.Kind is HeadingKind.Phi or HeadingKind.Roll);
        if (isFixed && !double.IsNaN(context.Options.FixedDeg))
        {
            return new() { Kind = kinds[0], Fixed = context.Options.FixedDeg };
        }

        if (isFixed && !double.IsNaN(named))
        {
            context.Note("angle-from-name", string.Create(CultureInfo.InvariantCulture, $"{hints[0].Kind} {named:0.###} degrees was taken from the name of the file."), new SourcePlace(context.File));
            return new() { Kind = hints[0].Kind, Fixed = named };
        }

        return new();
    }

    private static double? FixedInPreamble(TableContext context, HeadingKind kind)
    {
        if (context.MetadataOf(kind) is { } entry && MetadataLine.TryQuantity(entry.Value, UnitKind.Angle, entry.KeyUnit.Kind == UnitKind.None ? new(UnitKind.Angle, 1.0, "deg") : entry.KeyUnit, out var value))
        {
            return value;
        }

        var told = context.Metadata("cut", "plane", "cut plane") is { } text ? NameHints.Angles(HeadingParser.Plain(text)).Where(hint => hint.Kind == kind).ToArray() : [];
        return told.Length == 1 ? told[0].Deg : null;
    }

    private static void Contradicts(TableContext context, string what, double preamble, double named, string unit)
    {
        if (!double.IsNaN(named) && Math.Abs(named - preamble) > 1e-6 * Math.Max(1.0, Math.Abs(preamble)))
        {
            context.Doubt("name-contradicts", string.Create(CultureInfo.InvariantCulture, $"The preamble gives {what} {preamble:0.######} {unit}, the name of the file {named:0.######} {unit}: the preamble was believed."), new SourcePlace(context.File));
        }
    }
}
