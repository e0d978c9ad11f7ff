using System.Text;
using RangeReduce.Diagnostics;
using RangeReduce.Networks.Touchstone;

namespace RangeReduce.Tests.Networks.Touchstone;

public sealed class TouchstoneMutationTests
{
    private const int Inputs = 20_000;

    private static readonly byte[][] Seeds =
    [
        Encoding.ASCII.GetBytes("! made up\n# GHz S MA R 50\n1 0.5 10\n2 0.4 20 ! c\n3 0.3 30\n"),
        Encoding.ASCII.GetBytes("# MHz S RI R 50\n900 0.1 0 0.2 0 0.2 0 0.3 0\n1800 0.1 0 0.2 0 0.2 0 0.3 0\n500 1 0.5 90 0.3\n"),
        Encoding.ASCII.GetBytes("[Version] 2.0\n# GHz Z RI R 50\n[Number of Ports] 2\n[Two-Port Data Order] 12_21\n[Number of Frequencies] 1\n[Reference] 50 75\n[Matrix Format] Lower\n[Network Data]\n1 10 0\n5 0 20 0\n[End]\n"),
        Encoding.ASCII.GetBytes("# GHz S RI R 50\n1 .11 0 .12 .5 .13 0\n.21 -.5 .22 0 .23 0\n.31 0 .32 0 .33 0\n"),
    ];

    [Fact]
    public void Every_damaged_file_ends_in_data_or_in_an_error_with_its_place()
    {
        var random = new Random(20260501);
        var (data, errors) = (0, 0);
        for (var i = 0; i < Inputs; i++)
        {
            var seed = Seeds[i % Seeds.Length];
            try
            {
                var file = TouchstoneReader.Parse(Mutated(seed, random), "a.ts");
                Assert.NotEmpty(file.Sweep.FrequencyHz);
                data++;
            }
            catch (MeasurementDataException error)
            {
                Assert.Equal("a.ts", error.Place.File);
                Assert.True(error.Place.Line >= 1, error.Message);
                errors++;
            }
        }

        Assert.True(data > 0 && errors > 0);
    }

    private static byte[] Mutated(byte[] seed, Random random)
    {
        var bytes = new List<byte>(seed);
        for (var changes = random.Next(1, 6); changes > 0 && bytes.Count > 0; changes--)
        {
            var at = random.Next(bytes.Count);
            var length = random.Next(1, Math.Min(16, bytes.Count - at) + 1);
            switch (random.Next(4))
            {
                case 0:
                    bytes[at] = (byte)random.Next(256);
                    break;
                case 1:
                    bytes.RemoveRange(at, length);
                    break;
                case 2:
                    bytes.InsertRange(at, bytes.GetRange(at, length));
                    break;
                default:
                    bytes.InsertRange(at, seed.Skip(random.Next(seed.Length)).Take(length));
                    break;
            }
        }

        return [.. bytes];
    }
}
