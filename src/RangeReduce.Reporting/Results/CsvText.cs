using CsvHelper;

namespace RangeReduce.Reporting.Results;

/// <summary>Opens a comma-separated text the way all our tables are written: UTF-8 without mark, line feeds, decimal points.</summary>
internal static class CsvText
{
    /// <summary>Opens a writer that leaves the stream open.</summary>
    public static CsvWriter Open(Stream target) => CsvWriter.Create(target, new CsvWriterOptions { NewLine = "\n" }, leaveOpen: true);
}
