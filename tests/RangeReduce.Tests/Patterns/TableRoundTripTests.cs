using System.Globalization;
using System.Text;
using CsCheck;

namespace RangeReduce.Tests.Patterns;

/// <summary>The same samples come back from every way of writing them.</summary>
public sealed class TableRoundTripTests
{
    private static readonly Gen<(double[] FrequencyMHz, int[] AngleDeg, double[][] Samples)> Data =
        from frequencies in Gen.Int[1000, 3000].HashSet[1, 4]
        from angles in Gen.Int[-180, 180].HashSet[2, 8]
        let cells = frequencies.Count * angles.Count
        from samples in Gen.Double[-50.0, 50.0].Array[cells].Array[4]
        select (frequencies.Select(f => f / 2.0).Order().ToArray(), angles.Order().ToArray(), samples);

    private static readonly Gen<(string Separator, char Decimal)> Dialects = Gen.OneOf((",", '.'), (";", '.'), (";", ','), ("\t", '.'), ("\t", ','), ("  ", '.'), (" ", ','), ("|", '.'));

    private static readonly Gen<(string Heading, double PerMHz)> Units = Gen.OneOf(("f/Hz", 1e6), ("f/kHz", 1e3), ("Freq[MHz]", 1.0), ("frequency_GHz", 1e-3));

    [Fact]
    public void Long_tables_of_any_dialect_unit_and_order_of_columns_read_back_the_same() =>
        Gen.Select(Data, Dialects, Units, Gen.Shuffle(Enumerable.Range(0, 6).ToArray()), Gen.Bool, Gen.Bool, Gen.Int).Sample((data, dialect, unit, order, polar, angleMajor, mix) =>
        {
            string[] headings = [unit.Heading, "theta/deg", polar ? "H[dB]" : "H_re", polar ? "H[deg]" : "H_im", polar ? "RHCP_dB" : "Re(RHCP)", polar ? "phase(RHCP)" : "Im(RHCP)"];
            var text = new StringBuilder(string.Join(dialect.Separator, order.Select(at => headings[at]))).Append('\n');
            var rows = Enumerable.Range(0, data.Samples[0].Length).ToArray();
            if (angleMajor)
            {
                rows = [.. rows.OrderBy(row => row % data.AngleDeg.Length)];
            }
            else if (mix % 3 == 0)
            {
                rows = [.. rows.OrderBy(row => unchecked((row + 1) * 7919 * mix) % 101)];
            }

            foreach (var row in rows)
            {
                double[] cells = [data.FrequencyMHz[row / data.AngleDeg.Length] * unit.PerMHz, data.AngleDeg[row % data.AngleDeg.Length], .. data.Samples.Select(column => column[row])];
                text.Append(string.Join(dialect.Separator, order.Select(at => Number(cells[at], dialect.Decimal)))).Append('\n');
            }

            var cut = TableText.ReadCut(text.ToString());
            Same(data.FrequencyMHz, data.AngleDeg, cut);
            for (var cell = 0; cell < rows.Length; cell++)
            {
                var (frequency, angle) = (cell / data.AngleDeg.Length, cell % data.AngleDeg.Length);
                foreach (var (name, first) in new[] { ("h", 0), ("right", 2) })
                {
                    var (a, b) = (data.Samples[first][cell], data.Samples[first + 1][cell]);
                    var expected = polar ? TableText.Polar(a, b) : new(a, b);
                    TableText.Near(expected, cut.At(name, frequency, angle), 1e-12 * Math.Max(1e-3, expected.Magnitude));
                }
            }
        });

    [Fact]
    public void Wide_tables_read_back_the_same() =>
        Gen.Select(Data, Dialects, Gen.Bool).Sample((data, dialect, down) =>
        {
            var text = new StringBuilder(down ? "unit: dB\n" : string.Empty);
            text.Append(string.Join(dialect.Separator, data.FrequencyMHz.Select(f => $"{f.ToString("R", CultureInfo.InvariantCulture)}MHz{(down ? string.Empty : "[dB]")}").Prepend("theta/deg"))).Append('\n');
            for (var angle = 0; angle < data.AngleDeg.Length; angle++)
            {
                var cells = Enumerable.Range(0, data.FrequencyMHz.Length).Select(frequency => data.Samples[0][(frequency * data.AngleDeg.Length) + angle]).Prepend(data.AngleDeg[angle]);
                text.Append(string.Join(dialect.Separator, cells.Select(cell => Number(cell, dialect.Decimal)))).Append('\n');
            }

            var cut = TableText.ReadCut(text.ToString(), "lhcp.csv");
            Same(data.FrequencyMHz, data.AngleDeg, cut);
            for (var cell = 0; cell < data.Samples[0].Length; cell++)
            {
                var expected = TableText.Polar(data.Samples[0][cell], 0.0);
                TableText.Near(expected, cut.At("left", cell / data.AngleDeg.Length, cell % data.AngleDeg.Length), 1e-12 * expected.Magnitude);
            }
        });

    private static string Number(double value, char sign) => value.ToString("R", CultureInfo.InvariantCulture).Replace('.', sign);

    private static void Same(double[] frequencyMHz, int[] angleDeg, RangeReduce.Patterns.RawCut cut)
    {
        Assert.Equal(angleDeg.Select(angle => (double)angle), cut.AngleDeg);
        Assert.Equal(frequencyMHz.Select(f => f * 1e6), cut.FrequencyHz);
    }
}
