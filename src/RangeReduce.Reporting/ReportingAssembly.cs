namespace RangeReduce.Reporting;

/// <summary>Marks the assembly that holds the fonts and other embedded files.</summary>
internal static class ReportingAssembly
{
    /// <summary>Reads an embedded file.</summary>
    /// <param name="name">Its name with folder and forward slash, such as <c>Fonts/DejaVuSans.ttf</c>.</param>
    /// <exception cref="InvalidOperationException">There is no such file: a defect of the build.</exception>
    public static byte[] ReadFile(string name)
    {
        using var stream = typeof(ReportingAssembly).Assembly.GetManifestResourceStream(name)
            ?? throw new InvalidOperationException($"The assembly holds no file {name}.");
        var bytes = new byte[stream.Length];
        stream.ReadExactly(bytes);
        return bytes;
    }
}
