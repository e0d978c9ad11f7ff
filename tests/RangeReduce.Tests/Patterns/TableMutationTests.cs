using System.Text;
using RangeReduce.Diagnostics;
using RangeReduce.Patterns.Tables;

namespace RangeReduce.Tests.Patterns;

/// <summary>Damaged tables end in data or in a located error, whatever the damage.</summary>
public sealed class TableMutationTests
{
    private const int Mutations = 20_000;

    private static readonly byte[][] Whole = Array.ConvertAll<string, byte[]>(
        [
            "# phi: 45\nFrequency [GHz],Phi [deg],Theta [deg],H [dB],H [deg],V [dB],V [deg]\n1.60,45,-2,-20,0,-40,90\n1.60,45,0,-19,10,--,80\n1.62,45,-2,-17,30,-9999,60\n1.62,45,0,-16,40,-36,50\n",
            "Freq (MHz);Az [\u00B0];E_theta re;E_theta im\n1620;-10;1,5;2\n1620;10;1,6;3\n# phi: 90\n1620;-10;2,5;2\n",
            "unit: dB\nTheta [deg]\t1.60 GHz\t1.62 GHz\n-10\t-1\t-2\n0\t-3\t-4\n10\t-5\t-6\n",
            "! freq_mhz theta_deg phi_deg h_re h_im\n1620 -10 0 1 2\n1620 10 90 3 4\n",
            "# reference impedance: 75 ohm\nf [GHz],Return loss [dB],Phase [deg]\n1.6,6,45\n1.7,7,50\n",
            "Frequency [GHz],Gain [dBi],Uncertainty [dB]\n1.6,10.1,0.25\n1.5,9.9,0.3\n",
            "Time,f [GHz],az [deg],el [deg],H mag,Comment\n12:00,1.6,0,10,0.5,ok\n12:01,1.6,0,20,0.4,\"a, b\"\n",
        ],
        Encoding.UTF8.GetBytes);

    private static readonly byte[][] Splinters = Array.ConvertAll<string, byte[]>(
        [",", ";", "\t", "\"", "\n", "\r\n", "\0", "-", "e999", "NaN", "1e308", "-9999", "[", "]", "(", "=", ":", "#", "\u00B0", "phi=45", "GHz", "99999999999999999999", " ", "\uFEFF", "\u0001", "re", "im", "\\", "/"],
        Encoding.UTF8.GetBytes);

    [Fact]
    public void Every_damaged_table_ends_in_data_or_in_a_located_error()
    {
        var random = new Random(20260131);
        var (read, refused) = (0, 0);
        for (var turn = 0; turn < Mutations; turn++)
        {
            var bytes = Damaged(random);
            try
            {
                var table = TableReader.Read(bytes, "damaged_1620MHz.csv");
                Consistent(table);
                read++;
            }
            catch (MeasurementDataException fault)
            {
                Assert.True(fault.Place.File.Length > 0 && fault.Code.Length > 0);
                refused++;
            }
            catch (Exception fault) when (fault is not Xunit.Sdk.XunitException)
            {
                Assert.Fail($"turn {turn}: {fault}\n{Convert.ToBase64String(bytes)}");
            }

            _ = TableReader.LooksLikeTable(bytes);
        }

        // A damage that is always refused, or never, would test nothing.
        Assert.True(read > Mutations / 20 && refused > Mutations / 20, $"{read} read, {refused} refused");
    }

    private static void Consistent(MeasurementTable table)
    {
        foreach (var cut in table.Cuts)
        {
            var cells = cut.FrequencyHz.Length * cut.AngleDeg.Length;
            Assert.All(cut.Channels, channel => Assert.True(channel.Samples.Re.Length == cells && (channel.Samples.Im?.Length ?? cells) == cells));
            Assert.True(cut.AngleDeg.Zip(cut.AngleDeg.Skip(1)).All(pair => pair.First < pair.Second));
            Assert.True(cut.FrequencyHz.Zip(cut.FrequencyHz.Skip(1)).All(pair => pair.First < pair.Second));
        }

        Assert.True(table.Cuts.Count > 0 || table.Sweep is not null || table.Gain is not null);
    }

    private static byte[] Damaged(Random random)
    {
        var bytes = Whole[random.Next(Whole.Length)].ToList();
        for (var blow = random.Next(1, 4); blow > 0 && bytes.Count > 1; blow--)
        {
            var at = random.Next(bytes.Count);
            var length = Math.Min(random.Next(1, 12), bytes.Count - at);
            switch (random.Next(6))
            {
                case 0:
                    bytes[at] ^= (byte)(1 << random.Next(8));
                    break;
                case 1:
                    bytes.RemoveRange(at, length);
                    break;
                case 2:
                    bytes.RemoveRange(at, bytes.Count - at);
                    break;
                case 3:
                    bytes.InsertRange(at, Splinters[random.Next(Splinters.Length)]);
                    break;
                case 4:
                    bytes.InsertRange(at, [.. bytes.GetRange(at, length)]);
                    break;
                default:
                    var other = Whole[random.Next(Whole.Length)];
                    var from = random.Next(other.Length);
                    bytes.InsertRange(at, other.AsSpan(from, Math.Min(random.Next(1, 60), other.Length - from)).ToArray());
                    break;
            }
        }

        return [.. bytes];
    }
}
