using System.Globalization;
using System.Text;
using RangeReduce.Diagnostics;

namespace RangeReduce.Networks.Touchstone;

/// <content>The keywords of version 2.</content>
internal sealed partial class TouchstoneParser
{
    private static readonly HashSet<string> Once = new(StringComparer.Ordinal)
    {
        "number of ports", "two-port data order", "number of frequencies", "number of noise frequencies", "reference", "matrix format", "mixed-mode order",
    };

    private readonly HashSet<string> _keywords = new(StringComparer.Ordinal);

    private void ReadKeyword(ReadOnlySpan<byte> body, LineCursor lines)
    {
        var close = body.IndexOf((byte)']');
        var place = lines.Place();
        if (close < 0 && _part == Part.Information)
        {
            return;
        }

        if (close < 0)
        {
            throw TouchstoneErrors.UnknownKeyword(place, TouchstoneErrors.Quote(body));
        }

        var keyword = Encoding.Latin1.GetString(body[1..close]).Trim().ToLowerInvariant();
        var rest = body[(close + 1)..].Trim(" \t"u8);
        var value = Encoding.Latin1.GetString(rest);
        if (_part == Part.Information)
        {
            _part = keyword is "end information" ? Part.Head : Part.Information;
            return;
        }

        (_isAwaitingReference, _isPassingOver) = (false, false);
        if (keyword is "version")
        {
            ReadVersion(value, place);
            return;
        }

        if (_header is null)
        {
            throw TouchstoneErrors.VersionNotFirst(place, TouchstoneErrors.Quote(body));
        }

        if (_option is null)
        {
            throw TouchstoneErrors.MissingOptionLine(place, TouchstoneErrors.Quote(body));
        }

        RefuseOutOfPlace(keyword, place, TouchstoneErrors.Quote(body));
        _lastKeyword = keyword;
        switch (keyword)
        {
            case "number of ports":
                _header.Ports = (int)Count(value, place, options.MostPorts);
                break;
            case "two-port data order":
                _header.ColumnFirst = value switch
                {
                    "21_12" => true,
                    "12_21" => false,
                    _ => throw TouchstoneErrors.BadKeywordValue(place, $"'{value}'", "12_21 or 21_12"),
                };
                break;
            case "number of frequencies":
                _header.Frequencies = Count(value, place, long.MaxValue);
                break;
            case "number of noise frequencies":
                _header.NoiseFrequencies = Count(value, place, long.MaxValue);
                RefuseNoiseUnlessTwoPorts(place);
                break;
            case "reference":
                (_isAwaitingReference, _header.ReferenceLine) = (true, lines.Number);
                ReadReferences(rest, lines);
                break;
            case "matrix format":
                _header.Format = value.ToLowerInvariant() switch
                {
                    "full" => MatrixFormat.Full,
                    "lower" => MatrixFormat.Lower,
                    "upper" => MatrixFormat.Upper,
                    _ => throw TouchstoneErrors.BadKeywordValue(place, $"'{value}'", "Full, Lower or Upper"),
                };
                break;
            case "mixed-mode order":
                _header.MixedMode = MixedModeOrder.Read(value.Split((char[])[' ', '\t'], StringSplitOptions.RemoveEmptyEntries), _header.Ports, place);
                break;
            case "begin information":
                _part = Part.Information;
                break;
            case "network data":
                RefuseValue(value, place);
                BeginNetworkData(place);
                break;
            case "noise data":
                RefuseValue(value, place);
                RefuseNoiseUnlessTwoPorts(place);
                CloseRecord();
                _part = Part.Noise;
                break;
            case "end":
                CloseRecord();
                _part = Part.End;
                break;
            default:
                _isPassingOver = true;
                Remark("unknown-keyword", $"The keyword [{keyword}] is not known and was passed over with what follows it.", severity: RemarkSeverity.Doubt);
                break;
        }
    }

    /// <summary>Holds the order of the file: header, network data, noise data, end; what a header keyword states holds for all data, so it cannot change among them.</summary>
    private void RefuseOutOfPlace(string keyword, SourcePlace place, string found)
    {
        if (_part == Part.Head && keyword is "noise data" or "end" && _store is null)
        {
            throw TouchstoneErrors.MissingKeyword(place, "missing-network-data", "[Network Data]", found);
        }

        if ((_part == Part.Data && keyword is not ("noise data" or "end")) || (_part == Part.Noise && keyword is not "end"))
        {
            throw TouchstoneErrors.KeywordAmongData(place, found);
        }

        // Keywords that are not known are passed over, so they may stand twice.
        if (Once.Contains(keyword) && !_keywords.Add(keyword))
        {
            throw TouchstoneErrors.RepeatedKeyword(place, found);
        }
    }

    private static void RefuseValue(string value, SourcePlace place)
    {
        if (value.Length > 0)
        {
            throw TouchstoneErrors.BadKeywordValue(place, $"'{value[..Math.Min(40, value.Length)]}'", "data from the next line on");
        }
    }

    private void ReadVersion(string value, SourcePlace place)
    {
        if (_option is not null || _header is not null)
        {
            throw TouchstoneErrors.VersionNotFirst(place, "[Version]");
        }

        _header = value is "2.0" or "2.1" ? new() { Version = value } : throw TouchstoneErrors.UnknownVersion(place, $"'{value}'");
    }

    private void ReadReferences(ReadOnlySpan<byte> text, LineCursor lines)
    {
        var items = new ItemCursor(text);
        var fortran = false;
        while (items.Next(out var item))
        {
            var place = lines.PlaceOf(item);
            var ohm = NumberReader.Read(item, 0, place, ref fortran);
            _header!.ReferenceOhm.Add(ohm > 0.0 ? ohm : throw TouchstoneErrors.BadReference(place, TouchstoneErrors.Quote(item)));
            if (_header.ReferenceOhm.Count > options.MostPorts)
            {
                throw TouchstoneErrors.ReferenceCount(place, _header.ReferenceOhm.Count, _header.Ports);
            }
        }
    }

    private void BeginNetworkData(SourcePlace place)
    {
        var header = _header!;
        if (header.Ports == 0)
        {
            throw TouchstoneErrors.MissingKeyword(place, "missing-number-of-ports", "[Number of Ports]", "[Network Data]");
        }

        if (header.Ports == 2 && header.ColumnFirst is null)
        {
            throw TouchstoneErrors.MissingKeyword(place, "missing-two-port-order", "[Two-Port Data Order]", "[Network Data]");
        }

        if (header.Frequencies == 0)
        {
            throw TouchstoneErrors.MissingKeyword(place, "missing-number-of-frequencies", "[Number of Frequencies]", "[Network Data]");
        }

        if (header.ReferenceLine > 0 && header.ReferenceOhm.Count != header.Ports)
        {
            throw TouchstoneErrors.ReferenceCount(new(file, header.ReferenceLine, 1), header.ReferenceOhm.Count, header.Ports);
        }

        if (PortsByExtension(file) is var byExtension && byExtension > 0 && byExtension != header.Ports)
        {
            Remark("extension-disagrees", FormattableString.Invariant($"The ending .s{byExtension}p disagrees with [Number of Ports] {header.Ports}; the keyword is believed."), severity: RemarkSeverity.Doubt);
        }

        _part = Part.Data;
    }

    private void FinishVersion2(SourcePlace end)
    {
        if (_part != Part.End)
        {
            throw _part == Part.Head && _lastKeyword.Length == 0
                ? TouchstoneErrors.MissingKeyword(end, "missing-network-data", "[Network Data]", "the end of the file")
                : TouchstoneErrors.MissingEnd(end);
        }

        if ((_store?.Records ?? 0) != _header!.Frequencies)
        {
            throw TouchstoneErrors.FrequencyCount(end, "[Number of Frequencies]", _header.Frequencies, _store?.Records ?? 0);
        }

        if (_noise.Count != _header.NoiseFrequencies)
        {
            throw TouchstoneErrors.FrequencyCount(end, "[Number of Noise Frequencies]", _header.NoiseFrequencies, _noise.Count);
        }
    }

    private void RefuseNoiseUnlessTwoPorts(SourcePlace place)
    {
        if (_header!.Ports != 2)
        {
            throw TouchstoneErrors.NoiseNeedsTwoPorts(place);
        }
    }

    private static long Count(string value, SourcePlace place, long most) =>
        long.TryParse(value, NumberStyles.None, CultureInfo.InvariantCulture, out var count) && count > 0 && count <= most
            ? count
            : throw TouchstoneErrors.BadKeywordValue(place, $"'{value}'", most == long.MaxValue ? "a whole number above 0" : FormattableString.Invariant($"a whole number from 1 to {most}"));
}
