using RangeReduce.Diagnostics;
using RangeReduce.Runs.Assembly;
using RangeReduce.Runs.Planning;

namespace RangeReduce.Runs;

/// <summary>Reads a measurement folder into memory.</summary>
public static class MeasurementRunReader
{
    /// <summary>Reads a folder: by its run.toml where it has one, else by names and content.</summary>
    /// <param name="folder">The measurement folder.</param>
    /// <param name="progress">Takes the share of bytes read, 0 to 1; may be called from several threads.</param>
    /// <param name="cancellationToken">Stops the work.</param>
    /// <returns>The run. A file that is wrong is left out with a remark of the severity <see cref="RemarkSeverity.Fault"/>; the rest is there.</returns>
    /// <exception cref="MeasurementDataException">The folder is missing or empty, run.toml is wrong, or nothing in the folder can be used.</exception>
    /// <exception cref="UnauthorizedAccessException">The folder itself may not be listed.</exception>
    public static MeasurementRun Read(string folder, IProgress<double>? progress = null, CancellationToken cancellationToken = default) =>
        RunReading.Read(folder, InputReaders.All, progress, cancellationToken).Run;
}
