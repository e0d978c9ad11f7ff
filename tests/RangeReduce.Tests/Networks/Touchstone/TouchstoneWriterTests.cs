using System.Text;
using CsCheck;
using RangeReduce.Networks;
using RangeReduce.Networks.Touchstone;

namespace RangeReduce.Tests.Networks.Touchstone;

public sealed class TouchstoneWriterTests
{
    private static readonly Gen<NetworkSweep> Sweeps =
        from ports in Gen.Int[1, 6]
        from steps in Gen.Double[1e-3, 1e9].Array[1, 5]
        from values in Gen.Double.Where(double.IsFinite).Array[2 * steps.Length * ports * ports]
        from reference in Gen.Double[0.1, 1000.0]
        select Make(ports, steps, values, reference);

    [Fact]
    public void Any_sweep_survives_writing_and_reading_in_version_1_bit_for_bit() => Sweeps.Sample(sweep => Same(sweep, writer => TouchstoneWriter.WriteVersion1(sweep, writer)), iter: 2000, seed: "000000000001");

    [Fact]
    public void Any_sweep_survives_writing_and_reading_in_version_2_bit_for_bit() => Sweeps.Sample(sweep => Same(sweep, writer => TouchstoneWriter.WriteVersion2(sweep, writer, "2.0")), iter: 2000, seed: "000000000002");

    [Fact]
    public void Different_references_need_version_2()
    {
        var sweep = new NetworkSweep([1e9], 2, [50.0, 75.0], [0.1, 0.2, 0.3, 0.4], new double[4]);
        Assert.Throws<ArgumentException>(() => TouchstoneWriter.WriteVersion1(sweep, TextWriter.Null));
        Assert.True(Same(sweep, writer => TouchstoneWriter.WriteVersion2(sweep, writer)));
    }

    private static bool Same(NetworkSweep sweep, Action<TextWriter> write)
    {
        using var text = new StringWriter();
        write(text);
        var read = TouchstoneReader.Parse(Encoding.ASCII.GetBytes(text.ToString()), $"a.s{sweep.Ports}p").Sweep;
        return read.Ports == sweep.Ports
            && Bits(read.FrequencyHz).SequenceEqual(Bits(sweep.FrequencyHz))
            && Bits(read.ReferenceOhm).SequenceEqual(Bits(sweep.ReferenceOhm))
            && Bits(read.Re).SequenceEqual(Bits(sweep.Re))
            && Bits(read.Im).SequenceEqual(Bits(sweep.Im));
    }

    // Compared as bits, so that −0 and 0 differ.
    private static IEnumerable<long> Bits(double[] values) => values.Select(BitConverter.DoubleToInt64Bits);

    private static NetworkSweep Make(int ports, double[] steps, double[] values, double reference)
    {
        var frequencies = new double[steps.Length];
        for (var i = 0; i < steps.Length; i++)
        {
            frequencies[i] = (i == 0 ? 0.0 : frequencies[i - 1]) + steps[i];
        }

        var half = values.Length / 2;
        return new(frequencies, ports, [.. Enumerable.Repeat(reference, ports)], values[..half], values[half..]);
    }
}
