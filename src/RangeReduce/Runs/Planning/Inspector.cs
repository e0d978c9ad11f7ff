using System.Security.Cryptography;
using RangeReduce.Diagnostics;
using RangeReduce.Runs.Discovery;

namespace RangeReduce.Runs.Planning;

/// <summary>Takes the first look at each file: its first bytes and its checksum.</summary>
internal static class Inspector
{
    /// <summary>Data files above this size are refused before they fill the memory.</summary>
    public const long MostDataBytes = 1L << 30;

    private const long MostOtherBytes = 64L << 20;
    private const int HeadBytes = 64 << 10;
    private static readonly string[] DataEndings = [".csv", ".tsv", ".txt", ".dat", ".ts", ".asc", ".cut"];

    /// <summary>Looks at all files, side by side.</summary>
    public static Inspection[] LookAt(IReadOnlyList<FoundFile> files, IInputReaders readers, CancellationToken cancellationToken)
    {
        var looks = new Inspection[files.Count];
        var options = new ParallelOptions { CancellationToken = cancellationToken, MaxDegreeOfParallelism = Environment.ProcessorCount };
        Parallel.For(0, files.Count, options, at => looks[at] = LookAt(files[at], readers, cancellationToken));
        return looks;
    }

    /// <summary>Says whether the ending of a name is one that data files have.</summary>
    public static bool HasDataEnding(string path)
    {
        var ending = Path.GetExtension(path);
        return DataEndings.Contains(ending, StringComparer.OrdinalIgnoreCase)
            || (ending.Length > 3 && ending[1] is 's' or 'S' && ending[^1] is 'p' or 'P' && ending[2..^1].All(char.IsAsciiDigit));
    }

    /// <summary>Makes the error about a file that cannot be opened.</summary>
    public static MeasurementDataException Unreadable(string path) =>
        new(new(path), "unreadable-file", "a file that cannot be opened", "a file that may be read", "Check its permissions.");

    private static Inspection LookAt(FoundFile file, IInputReaders readers, CancellationToken cancellationToken)
    {
        // Pipes and devices have no length either: what is empty is never opened.
        if (file.Bytes == 0)
        {
            var fault = HasDataEnding(file.Path) && file.PassedOver is null ? new MeasurementDataException(new(file.Path), "empty-file", "an empty file", "measurement data", "Export it again.") : null;
            return new(InputKind.Other, Convert.ToHexStringLower(SHA256.HashData([])), fault);
        }

        try
        {
            using var stream = new FileStream(file.FullPath, FileMode.Open, FileAccess.Read, FileShare.Read, bufferSize: 0, FileOptions.SequentialScan);
            var head = new byte[(int)Math.Min(HeadBytes, file.Bytes)];
            var length = stream.ReadAtLeast(head, head.Length, throwOnEndOfStream: false);
            var (guess, fault) = Judge(file, head.AsSpan(0, length), readers);
            if (guess == InputKind.Other && file.Bytes > MostOtherBytes)
            {
                return new(guess, string.Empty, fault);
            }

            using var hash = IncrementalHash.CreateHash(HashAlgorithmName.SHA256);
            hash.AppendData(head, 0, length);
            var block = new byte[1 << 20];
            for (int read; (read = stream.Read(block)) > 0;)
            {
                cancellationToken.ThrowIfCancellationRequested();
                hash.AppendData(block, 0, read);
            }

            return new(guess, Convert.ToHexStringLower(hash.GetHashAndReset()), fault);
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException)
        {
            return new(InputKind.Other, string.Empty, Unreadable(file.Path));
        }
    }

    private static (InputKind Guess, MeasurementDataException? Fault) Judge(FoundFile file, ReadOnlySpan<byte> head, IInputReaders readers)
    {
        if (file.PassedOver is not null)
        {
            return (InputKind.Other, null);
        }

        if (!head.ContainsAnyExcept((byte)0))
        {
            return (InputKind.Other, new(new(file.Path), "zero-bytes", "nothing but zero bytes at the beginning, as after a broken copy", "measurement data", "Copy or export it again."));
        }

        var guess = readers.Recognise(file.Path, head);
        return guess != InputKind.Other && file.Bytes > MostDataBytes
            ? (InputKind.Other, new(new(file.Path), "file-too-large", "a file of more than 1 GiB", "a file that fits into memory", "Split it by cut or by frequency."))
            : (guess, null);
    }
}
