using System.Globalization;
using System.Numerics;
using System.Text;
using RangeReduce.Diagnostics;

namespace RangeReduce.Networks.Touchstone;

/// <summary>Goes through the lines of a Touchstone text once: option line, keywords, records.</summary>
/// <param name="file">Path for messages.</param>
/// <param name="options">Limits.</param>
/// <param name="remarks">Takes remarks.</param>
internal sealed partial class TouchstoneParser(string file, TouchstoneOptions options, List<Remark> remarks)
{
    private readonly HashSet<string> _remarked = new(StringComparer.Ordinal);
    private readonly List<string> _comments = [];
    private readonly List<NoisePoint> _noise = [];

    private OptionLine? _option;
    private Version2Header? _header;
    private SweepStore? _store;
    private MatrixLayout? _layout;
    private double[] _record = new double[64];
    private int _recordCount;
    private SourcePlace _recordPlace;
    private int _ports;
    private int _line;
    private Part _part = Part.Head;
    private bool _wraps;
    private bool _isAwaitingReference;
    private bool _isPassingOver;
    private string _lastKeyword = string.Empty;

    private enum Part
    {
        Head,
        Data,
        Noise,
        Information,
        End,
    }

    /// <summary>Reads the text.</summary>
    /// <exception cref="MeasurementDataException">The text is wrong.</exception>
    public TouchstoneFile Parse(ReadOnlySpan<byte> text)
    {
        var lines = new LineCursor(text, file);
        while (lines.Next())
        {
            _line = lines.Number;
            if (lines.Line.Length > options.LongestLine)
            {
                throw TouchstoneErrors.TooMuch(lines.Place(), FormattableString.Invariant($"a line of {lines.Line.Length} bytes"), FormattableString.Invariant($"at most {options.LongestLine}"));
            }

            ReadLine(lines);
        }

        return Finish();
    }

    private void ReadLine(LineCursor lines)
    {
        var line = lines.Line;
        var mark = line.IndexOf((byte)'!');
        if (mark >= 0)
        {
            AddComment(line[(mark + 1)..], lines);
            line = line[..mark];
        }

        var body = line.Trim(" \t"u8);
        if (body.Length == 0)
        {
            return;
        }

        if (_part == Part.End)
        {
            Remark("text-after-end", "There is text behind [End], which was passed over.");
            return;
        }

        if (body[0] == (byte)'[')
        {
            ReadKeyword(body, lines);
        }
        else if (_part == Part.Information)
        {
            return;
        }
        else if (body[0] == (byte)'#')
        {
            ReadOption(body[1..], lines);
        }
        else if (_isPassingOver)
        {
            return;
        }
        else if (_isAwaitingReference)
        {
            ReadReferences(body, lines);
        }
        else
        {
            ReadNumbers(body, lines);
        }
    }

    private void AddComment(ReadOnlySpan<byte> comment, LineCursor lines)
    {
        if (comment.ContainsAnyExceptInRange((byte)0x01, (byte)0x7E))
        {
            Remark("non-ascii-comment", "A comment holds characters outside ASCII.", lines.Number);
        }

        if (_comments.Count < 1000)
        {
            _comments.Add(Decoded(comment).Trim());
        }
        else
        {
            Remark("comments-left-out", "The file has more than 1000 comments; the others were left out.", lines.Number);
        }
    }

    private static string Decoded(ReadOnlySpan<byte> bytes) => System.Text.Unicode.Utf8.IsValid(bytes) ? Encoding.UTF8.GetString(bytes) : Encoding.Latin1.GetString(bytes);

    private void ReadOption(ReadOnlySpan<byte> text, LineCursor lines)
    {
        if (_option is not null)
        {
            Remark("second-option-line", "A second option line was passed over; such files are often pasted together.");
            return;
        }

        _option = OptionLine.Read(text, lines, (code, sentence) => Remark(code, sentence));
        if (_header is not null && _option.ReferenceOhm.Length > 1)
        {
            throw TouchstoneErrors.ReferenceCount(lines.Place(), _option.ReferenceOhm.Length, 1);
        }
    }

    private void ReadNumbers(ReadOnlySpan<byte> body, LineCursor lines)
    {
        if (_option is null)
        {
            throw TouchstoneErrors.MissingOptionLine(lines.Place(), TouchstoneErrors.Quote(body));
        }

        if (_header is not null && _part == Part.Head)
        {
            throw TouchstoneErrors.MissingKeyword(lines.Place(), "missing-network-data", "[Network Data]", TouchstoneErrors.Quote(body));
        }

        // An odd count of numbers opens a record, an even one continues it: a pair is never split over lines.
        var count = CountItems(body);
        var opens = count % 2 == 1;
        if (opens)
        {
            CloseRecord();
            (_recordPlace, _recordCount) = (lines.Place(), 0);
        }
        else if (_recordCount == 0 || _recordCount == CompleteRecord())
        {
            throw TouchstoneErrors.IncompleteRecord(lines.Place(), count, "a record that begins with a frequency: an odd count of numbers on its first line");
        }

        if (count > 9 && _header is null)
        {
            Remark("more-than-four-pairs", "A line holds more than the four pairs that version 1 allows.");
        }

        _wraps |= !opens;
        EnsureRoom(_recordCount + count, lines.Place());
        var items = new ItemCursor(body);
        var fortran = false;
        var first = opens;
        while (items.Next(out var item))
        {
            if (item.ContainsAnyExceptInRange((byte)0x21, (byte)0x7E))
            {
                throw TouchstoneErrors.NonAsciiData(lines.PlaceOf(item), TouchstoneErrors.Quote(item));
            }

            _record[_recordCount++] = NumberReader.Read(item, first ? _option.FrequencyExponent : 0, lines.PlaceOf(item), ref fortran);
            first = false;
        }

        if (fortran)
        {
            Remark("fortran-exponent", "Exponents are written with D, which was read as E.");
        }
    }

    /// <summary>Gives the numbers of a whole record where they are known; 0 before the first record of a file whose name does not tell.</summary>
    private int CompleteRecord() => _part == Part.Noise ? 5 : _layout?.Numbers ?? (_header is null && PortsByExtension(file) is var ports and > 0 ? 1 + (2 * ports * ports) : 0);

    private static int CountItems(ReadOnlySpan<byte> body)
    {
        var items = new ItemCursor(body);
        var count = 0;
        while (items.Next(out _))
        {
            count++;
        }

        return count;
    }

    private void EnsureRoom(int count, SourcePlace place)
    {
        var most = 1 + (2L * options.MostPorts * options.MostPorts);
        if (count > most)
        {
            throw TouchstoneErrors.TooMuch(place, FormattableString.Invariant($"a record of more than {most} numbers"), FormattableString.Invariant($"at most {options.MostPorts} ports"));
        }

        if (count > _record.Length)
        {
            Array.Resize(ref _record, Math.Max(count, 2 * _record.Length));
        }
    }

    private void CloseRecord()
    {
        if (_recordCount == 0)
        {
            return;
        }

        var place = _recordPlace;
        if (_part == Part.Noise)
        {
            AddNoise(place);
            return;
        }

        if (_store is null)
        {
            BeginData(place);
        }

        if (_header is null && _ports == 2 && _recordCount == 5 && _store!.Count > 0 && _record[0] <= _store.LastHz)
        {
            _part = Part.Noise;
            AddNoise(place);
            return;
        }

        if (_recordCount != _layout!.Numbers)
        {
            throw TouchstoneErrors.IncompleteRecord(place, _recordCount, FormattableString.Invariant($"{_layout.Numbers} numbers for {_ports} ports"));
        }

        if (_wraps && _ports == 2 && _header is null)
        {
            Remark("two-port-record-split", "Two-port records run over more than one line.", place.Line);
        }

        if (!_store!.TryAdd(_record.AsSpan(0, _recordCount), place))
        {
            Remark("repeated-point", "A frequency stands twice with the same values, of which one was kept.", place.Line, RemarkSeverity.Doubt);
        }

        (_recordCount, _wraps) = (0, false);
    }

    private void BeginData(SourcePlace place)
    {
        var byExtension = PortsByExtension(file);
        if (_header is not null)
        {
            _ports = _header.Ports;
            _layout = new(_ports, _header.Format, _header.ColumnFirst ?? false);
        }
        else
        {
            var byContent = PortsByCount(_recordCount);
            _ports = byExtension > 0 ? byExtension : byContent;
            if (byExtension > 0 && byContent > 0 && byContent != byExtension)
            {
                throw TouchstoneErrors.PortCount(place, byExtension, _recordCount);
            }

            if (_ports == 0)
            {
                throw TouchstoneErrors.IncompleteRecord(place, _recordCount, "1 + 2 n² numbers for n ports: 3, 9, 19, 33, 51, ...");
            }

            if (byExtension == 0)
            {
                Remark("ports-from-content", FormattableString.Invariant($"The file name has no ending .sNp; the records make it {_ports} ports."));
            }

            _layout = new(_ports, MatrixFormat.Full, columnFirst: true);
            if (_option!.ReferenceOhm.Length != 1 && _option.ReferenceOhm.Length != _ports)
            {
                throw TouchstoneErrors.ReferenceCount(new(file, _option.Line, _option.Column), _option.ReferenceOhm.Length, _ports);
            }
        }

        if (_ports > options.MostPorts)
        {
            throw TouchstoneErrors.TooMuch(place, FormattableString.Invariant($"{_ports} ports"), FormattableString.Invariant($"at most {options.MostPorts}"));
        }

        if (_option!.Kind is ParameterKind.H or ParameterKind.G && _ports != 2)
        {
            throw TouchstoneErrors.UnknownOption(new(file, _option.Line, _option.Column), $"{_option.Kind} parameters of {_ports.ToString(CultureInfo.InvariantCulture)} ports");
        }

        _store = new(options, _layout, _ports, _option.Format);
        if (_header is null)
        {
            _part = Part.Data;
        }
    }

    private void AddNoise(SourcePlace place)
    {
        if (_recordCount != 5)
        {
            throw TouchstoneErrors.IncompleteRecord(place, _recordCount, "5 numbers of noise data");
        }

        if (_record[0] < 0.0)
        {
            throw TouchstoneErrors.BadFrequency(place, FormattableString.Invariant($"{_record[0]:R} Hz"));
        }

        if (_noise.Count > 0 && _record[0] <= _noise[^1].FrequencyHz)
        {
            throw TouchstoneErrors.FrequencyNotIncreasing(place, _record[0], _noise[^1].FrequencyHz, place.Line - 1);
        }

        // Noise lines are magnitude and angle whatever the option line says; version 1 normalises the resistance.
        var reflection = Complex.FromPolarCoordinates(_record[2], double.DegreesToRadians(_record[3]));
        _noise.Add(new(_record[0], _record[1], reflection, _header is null ? _record[4] * _option!.ReferenceOhm[0] : _record[4]));
        (_recordCount, _wraps) = (0, false);
    }

    private TouchstoneFile Finish()
    {
        var end = new SourcePlace(file, Math.Max(1, _line), 1);
        if (_option is null)
        {
            throw TouchstoneErrors.MissingOptionLine(end, "the end of the file");
        }

        CloseRecord();
        if (_header is not null)
        {
            FinishVersion2(end);
        }

        if (_store is null || _store.Count == 0)
        {
            throw TouchstoneErrors.NoData(end);
        }

        if (_store.HasNegativeMagnitude)
        {
            Remark("negative-magnitude", "Negative magnitudes were read as positive ones with the angle turned by 180 degrees.");
        }

        var references = _header is { ReferenceOhm.Count: > 0 } ? [.. _header.ReferenceOhm] : _option.ReferenceOhm.Length == _ports ? _option.ReferenceOhm : Enumerable.Repeat(_option.ReferenceOhm[0], _ports).ToArray();
        var (frequencies, re, im) = _store.Take();
        new NativeParameters(_option.Kind, _header is null, file).ToScattering(re, im, references, _header?.MixedMode, _option.Line);
        var sweep = new NetworkSweep(frequencies, _ports, references, re, im);
        if (_ports == 1 && Enumerable.Range(0, sweep.Count).Any(i => sweep[i, 0, 0].Magnitude > 1.0 + 1e-12))
        {
            Remark("not-passive", "The reflection coefficient exceeds 1 at some frequencies.", severity: RemarkSeverity.Doubt);
        }

        return new()
        {
            Sweep = sweep,
            Noise = _noise,
            Comments = _comments,
            Version = _header?.Version ?? (_option.ReferenceOhm.Length > 1 ? "1.1" : "1.0"),
            Kind = _option.Kind,
            Format = _option.Format,
            Remarks = remarks,
        };
    }

    private void Remark(string code, string text, int line = 0, RemarkSeverity severity = RemarkSeverity.Note)
    {
        if (_remarked.Add(code))
        {
            remarks.Add(new(severity, code, text, new(file, line > 0 ? line : _line)));
        }
    }

    /// <summary>Gives N of an ending .sNp, in any case; 0 where the name has none.</summary>
    private static int PortsByExtension(string file)
    {
        var ending = Path.GetExtension(file.AsSpan());
        return ending.Length > 3 && ending[1] is 's' or 'S' && ending[^1] is 'p' or 'P' && int.TryParse(ending[2..^1], NumberStyles.None, CultureInfo.InvariantCulture, out var ports) ? ports : 0;
    }

    /// <summary>Gives n where a record of 1 + 2 n² numbers fits, else 0.</summary>
    private static int PortsByCount(int numbers)
    {
        var ports = (int)Math.Round(Math.Sqrt((numbers - 1) / 2.0));
        return numbers == 1 + (2 * ports * ports) ? ports : 0;
    }
}
