using RangeReduce.Diagnostics;

namespace RangeReduce.Networks.Touchstone;

/// <summary>The option line: frequency unit, kind of parameters, format, reference impedance; items in any order, each with its default.</summary>
internal sealed record OptionLine
{
    /// <summary>Gets the power of ten of the frequency unit.</summary>
    public int FrequencyExponent { get; init; } = 9;

    /// <summary>Gets the kind of parameters.</summary>
    public ParameterKind Kind { get; init; } = ParameterKind.S;

    /// <summary>Gets the format of the pairs.</summary>
    public ParameterFormat Format { get; init; } = ParameterFormat.MagnitudeAngle;

    /// <summary>Gets the references in ohm, one or one a port.</summary>
    public double[] ReferenceOhm { get; init; } = [50.0];

    /// <summary>Gets the line it stands in.</summary>
    public int Line { get; init; }

    /// <summary>Gets the column it begins in.</summary>
    public int Column { get; init; }

    /// <summary>Reads an option line.</summary>
    /// <param name="text">The line from behind the <c>#</c>, without comment.</param>
    /// <param name="line">The cursor that gives places.</param>
    /// <param name="remark">Takes remarks.</param>
    /// <exception cref="MeasurementDataException">An item is unknown or a reference is missing.</exception>
    public static OptionLine Read(ReadOnlySpan<byte> text, LineCursor line, Action<string, string> remark)
    {
        var option = new OptionLine { Line = line.Number, Column = line.Place().Column };
        var references = new List<double>();
        var afterR = false;
        var (hasUnit, hasKind, hasFormat) = (false, false, false);
        var items = new ItemCursor(text);
        while (items.Next(out var item))
        {
            var place = line.PlaceOf(item);
            if (afterR && item[0] is (byte)'+' or (byte)'-' or (byte)'.' or (>= (byte)'0' and <= (byte)'9'))
            {
                references.Add(Reference(item, place));
            }
            else if (item.Length == 1 && (item[0] | 0x20) == 'r')
            {
                RefuseRepeated(ref afterR, item, place);
            }
            else if ((item[0] | 0x20) == 'r' && item.Length > 1 && item[1] is (byte)'.' or (>= (byte)'0' and <= (byte)'9'))
            {
                remark("reference-glued", "The reference impedance is written without a blank behind R.");
                RefuseRepeated(ref afterR, item, place);
                references.Add(Reference(item[1..], place));
            }
            else
            {
                // Only the number right behind R is bound to it: R left alone is no reference.
                if (afterR && references.Count == 0)
                {
                    throw TouchstoneErrors.BadReference(place, TouchstoneErrors.Quote(item));
                }

                option = WithItem(option, item, place);
                switch (item.Length, item[^1] | 0x20)
                {
                    case (_, 'z') when item.Length > 1:
                        RefuseRepeated(ref hasUnit, item, place);
                        break;
                    case (1, _):
                        RefuseRepeated(ref hasKind, item, place);
                        break;
                    default:
                        RefuseRepeated(ref hasFormat, item, place);
                        break;
                }
            }
        }

        if (afterR && references.Count == 0)
        {
            throw TouchstoneErrors.BadReference(line.Place(), "R without a number");
        }

        return references.Count == 0 ? option : option with { ReferenceOhm = [.. references] };
    }

    /// <summary>Two units or two formats on one line contradict each other; which one holds is not guessed.</summary>
    private static void RefuseRepeated(ref bool seen, ReadOnlySpan<byte> item, SourcePlace place) =>
        seen = !seen ? true : throw TouchstoneErrors.RepeatedOption(place, TouchstoneErrors.Quote(item));

    private static double Reference(ReadOnlySpan<byte> item, SourcePlace place)
    {
        var fortran = false;
        double value;
        try
        {
            value = NumberReader.Read(item, 0, place, ref fortran);
        }
        catch (MeasurementDataException)
        {
            throw TouchstoneErrors.BadReference(place, TouchstoneErrors.Quote(item));
        }

        return value > 0.0 ? value : throw TouchstoneErrors.BadReference(place, TouchstoneErrors.Quote(item));
    }

    private static OptionLine WithItem(OptionLine option, ReadOnlySpan<byte> item, SourcePlace place)
    {
        Span<byte> lower = stackalloc byte[4];
        if (item.Length <= lower.Length)
        {
            for (var i = 0; i < item.Length; i++)
            {
                lower[i] = (byte)(item[i] is >= (byte)'A' and <= (byte)'Z' ? item[i] | 0x20 : item[i]);
            }
        }

        var word = item.Length <= lower.Length ? System.Text.Encoding.Latin1.GetString(lower[..item.Length]) : string.Empty;
        return word switch
        {
            "hz" => option with { FrequencyExponent = 0 },
            "khz" => option with { FrequencyExponent = 3 },
            "mhz" => option with { FrequencyExponent = 6 },
            "ghz" => option with { FrequencyExponent = 9 },
            "s" => option with { Kind = ParameterKind.S },
            "y" => option with { Kind = ParameterKind.Y },
            "z" => option with { Kind = ParameterKind.Z },
            "h" => option with { Kind = ParameterKind.H },
            "g" => option with { Kind = ParameterKind.G },
            "ma" => option with { Format = ParameterFormat.MagnitudeAngle },
            "db" => option with { Format = ParameterFormat.DecibelAngle },
            "ri" => option with { Format = ParameterFormat.RealImaginary },
            _ => throw TouchstoneErrors.UnknownOption(place, TouchstoneErrors.Quote(item)),
        };
    }
}
