using RangeReduce.Patterns.Tables;

namespace RangeReduce.Tests.Patterns;

public sealed class TableFaultTests
{
    private const string Head = "f [GHz],theta [deg],H [dB],H [deg]\n1.62,0,-1,20\n";

    [Theory]
    [InlineData(Head + "1.62,10,abc,30\n", "bad-number", 3, 9)]
    [InlineData(Head + "1.62,ten,-1,30\n", "bad-number", 3, 6)]
    [InlineData(Head + "1.62,,-1,30\n", "bad-number", 3, 6)]
    [InlineData(Head + "1.62,10,-1.2.3,30\n", "bad-number", 3, 9)]
    [InlineData(Head + "1.62,10,-5000,30\n", "bad-level", 3, 9)]
    [InlineData(Head + "1.62,-9999,-1,30\n", "bad-angle", 3, 6)]
    [InlineData(Head + "0,10,-1,30\n", "bad-frequency", 3, 1)]
    [InlineData(Head + "1.62,10,-1\n", "short-row", 3, 0)]
    [InlineData(Head + "1.62,10,-1,30,7\n", "long-row", 3, 0)]
    [InlineData("f [GHz],theta [deg],H [deg]\n1.62,0,20\n", "missing-channel", 1, 21)]
    [InlineData("f [GHz],theta [deg],H re\n1.62,0,20\n", "missing-channel", 1, 21)]
    [InlineData("f,theta [deg],H [dB]\n1.62,0,20\n", "no-unit", 1, 1)]
    [InlineData("f [GHz],theta [deg],H level\n1.62,0,20\n", "no-unit", 1, 21)]
    [InlineData("f [GHz],theta [deg],H [dB],foo\n1.62,0,20,1\n", "unknown-heading", 1, 28)]
    [InlineData("f [GHz],theta [deg],H [dB],H (dB)\n1.62,0,20,1\n", "duplicate-column", 1, 28)]
    [InlineData("f [GHz],theta [deg],theta (rad),H (dB)\n1.62,0,20,1\n", "duplicate-column", 1, 21)]
    [InlineData("f [GHz],theta [deg],phi,az,H (dB)\n1.62,0,20,1,2\n", "too-many-angles", 1, 0)]
    [InlineData("f [GHz],theta [deg],E_theta [dBi],E_phi [dB]\n1.62,0,2,1\n", "mixed-units", 1, 35)]
    [InlineData("f [GHz],theta [deg]\n1.62,0\n", "no-channel", 1, 0)]
    [InlineData("f [GHz],theta [deg],H mag\n1.62,0,-3\n", "bad-level", 2, 8)]
    [InlineData("1.62,0,-3\n1.62,1,-4\n", "no-headings", 1, 0)]
    [InlineData("f [GHz],theta [deg],H [dB]\n1,62,0,-3,5\n", "no-headings", 2, 0)]
    [InlineData("hello\nworld\n", "no-table", 0, 0)]
    [InlineData("", "empty-file", 0, 0)]
    [InlineData("f [GHz],theta [deg],H [dB]\n", "no-table", 0, 0)]
    [InlineData("f [GHz],VSWR\n1.62,0.5\n", "bad-level", 2, 6)]
    [InlineData("# reference impedance: fifty\nf [GHz],VSWR\n1.62,1.5\n", "bad-reference", 0, 0)]
    [InlineData("# frequency: 1.62\ntheta [deg],H [dB]\n0,1\n1,2\n", "bad-frequency", 0, 0)]
    [InlineData("a\0b,c\n1,2\n", "not-text", 1, 0)]
    public void A_fault_has_its_code_and_its_place(string text, string code, int line, int column)
    {
        var fault = TableText.Fault(text);
        Assert.Equal(code, fault.Code);
        Assert.Equal(new RangeReduce.Diagnostics.SourcePlace("cut.csv", line, column), fault.Place);
        Assert.True(fault.Advice.Length > 0);
    }

    [Fact]
    public void A_bad_number_says_what_was_found_and_what_was_due() =>
        Assert.Equal("cut.csv:3:9: found \"a\\u0007bc\", expected a number for \"H [dB]\". Correct the cell, or leave it blank where the sample is missing.", TableText.Fault(Head + "1.62,10,a\u0007bc,30\n").Message);

    [Fact]
    public void Unknown_headings_are_listed_beside_those_that_were_understood()
    {
        var fault = TableText.Fault("f [GHz],theta [deg],H [dB],foo,bar\n1.62,0,20,1,2\n");
        Assert.Contains("\"foo\", \"bar\" (understood: \"f [GHz]\", \"theta [deg]\", \"H [dB]\")", fault.Found, StringComparison.Ordinal);
        Assert.Contains("run.toml", fault.Advice, StringComparison.Ordinal);
    }

    [Fact]
    public void Columns_that_no_figure_needs_are_noted_and_left_out()
    {
        var table = TableText.Read("Time,f [GHz],theta [deg],H [dB],Temp (C),Comment\n12:30:01,1.62,0,-1,22.5,ok\n12:30:02,1.62,10,-2,22.6,\"a, b\"\n");
        Assert.Equal("h", table.Cuts[0].ChannelNames());
        var remark = Assert.Single(table.Remarks);
        Assert.Equal("unused-columns", remark.Code);
        Assert.Contains("\"Time\", \"Temp (C)\", \"Comment\"", remark.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_file_of_zeros_is_refused_at_its_first_block()
    {
        using var endless = new ZeroStream();
        Assert.Equal("not-text", Assert.Throws<RangeReduce.Diagnostics.MeasurementDataException>(() => TableReader.Read(endless, "zeros.csv")).Code);
        Assert.InRange(endless.BytesRead, 1, 1 << 20);
    }

    private sealed class ZeroStream : Stream
    {
        public long BytesRead { get; private set; }

        public override bool CanRead => true;

        public override bool CanSeek => false;

        public override bool CanWrite => false;

        public override long Length => throw new NotSupportedException();

        public override long Position
        {
            get => throw new NotSupportedException();
            set => throw new NotSupportedException();
        }

        public override int Read(byte[] buffer, int offset, int count)
        {
            Array.Clear(buffer, offset, count);
            BytesRead += count;
            return count;
        }

        public override void Flush()
        {
        }

        public override long Seek(long offset, SeekOrigin origin) => throw new NotSupportedException();

        public override void SetLength(long value) => throw new NotSupportedException();

        public override void Write(byte[] buffer, int offset, int count) => throw new NotSupportedException();
    }
}
