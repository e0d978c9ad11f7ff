using RangeReduce.Diagnostics;
using RangeReduce.Runs.Planning;

namespace RangeReduce.Runs.Assembly;

/// <summary>Outcome of reading one file: content or error.</summary>
/// <param name="File">The file.</param>
/// <param name="Content">What it held; null where it could not be read or was not due.</param>
/// <param name="Fault">The error; null where there is none.</param>
internal sealed record FileReading(PlannedFile File, InputContent? Content, MeasurementDataException? Fault)
{
    /// <summary>Reads all files of a plan that are due, side by side, in the order of the plan.</summary>
    /// <param name="plan">The plan.</param>
    /// <param name="skipped">Ids of files that need not be read.</param>
    /// <param name="readers">The readers.</param>
    /// <param name="progress">Takes the share of bytes read, 0 to 1.</param>
    /// <param name="cancellationToken">Stops the work.</param>
    public static FileReading[] ReadAll(RunPlan plan, IReadOnlySet<string> skipped, IInputReaders readers, IProgress<double>? progress, CancellationToken cancellationToken)
    {
        var readings = new FileReading[plan.Files.Count];
        var columns = plan.Manifest?.Columns ?? [];
        var due = plan.Files.Where(file => file.IsRead && !skipped.Contains(file.Input.Id)).Sum(file => file.Input.Bytes);
        var done = 0L;
        var options = new ParallelOptions { CancellationToken = cancellationToken, MaxDegreeOfParallelism = Environment.ProcessorCount };
        Parallel.For(0, readings.Length, options, at =>
        {
            var file = plan.Files[at];
            if (!file.IsRead || skipped.Contains(file.Input.Id))
            {
                readings[at] = new(file, null, null);
                return;
            }

            readings[at] = ReadOne(file, readers, columns);
            progress?.Report((double)Interlocked.Add(ref done, file.Input.Bytes) / due);
        });
        return readings;
    }

    private static FileReading ReadOne(PlannedFile file, IInputReaders readers, IReadOnlyList<Manifest.ManifestColumn> columns)
    {
        try
        {
            return new(file, readers.Read(file.FullPath, file.Input.Path, columns), null);
        }
        catch (MeasurementDataException error)
        {
            return new(file, null, error);
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException)
        {
            return new(file, null, Inspector.Unreadable(file.Input.Path));
        }
    }
}
