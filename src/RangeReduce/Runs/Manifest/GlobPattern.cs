using System.IO.Enumeration;
using RangeReduce.Diagnostics;

namespace RangeReduce.Runs.Manifest;

/// <summary>A pattern for paths inside the measurement folder: <c>*</c> and <c>?</c> within a name, <c>**</c> for any number of folders.</summary>
/// <remarks>Upper and lower case differ on every platform, so that a run is understood alike everywhere.</remarks>
public sealed class GlobPattern
{
    private const int LongestText = 500;
    private readonly string[] _segments;

    private GlobPattern(string text, SourcePlace place) => (Text, Place, _segments) = (text, place, text.Split('/'));

    /// <summary>Gets the pattern as written.</summary>
    public string Text { get; }

    /// <summary>Gets where it stands in the manifest.</summary>
    public SourcePlace Place { get; }

    /// <summary>Takes a pattern, refusing every one that could lead out of the folder.</summary>
    /// <param name="text">The pattern, with forward slashes, relative to the measurement folder.</param>
    /// <param name="place">Where it stands, for messages.</param>
    /// <exception cref="MeasurementDataException">It is empty, absolute, climbs out of the folder or holds a character that paths here do not have.</exception>
    public static GlobPattern Parse(string text, SourcePlace place)
    {
        ArgumentNullException.ThrowIfNull(text);
        var segments = text.Split('/');
        var advice =
            text.Length is 0 or > LongestText ? "Name a file or a pattern such as right/*.s1p." :
            text.Contains('\\', StringComparison.Ordinal) ? "Write folders with forward slashes, on every platform." :
            text.Any(char.IsControl) ? "Take the control character out." :
            text[0] == '/' || (text.Length > 1 && text[1] == ':') ? "Write the path relative to the measurement folder." :
            segments.Contains("..", StringComparer.Ordinal) ? "A run reads nothing outside its folder: copy the file into it." :
            segments.Any(segment => segment.Length == 0 || segment is ".") ? "Take the empty part out of the path." :
            segments.Any(segment => segment.Contains("**", StringComparison.Ordinal) && segment is not "**") ? "Two stars stand for folders and must be alone between slashes." :
            null;
        return advice is null ? new(text, place) : throw new MeasurementDataException(place, "bad-pattern", FoundText.Show(text), "a path pattern inside the measurement folder", advice);
    }

    /// <summary>Says whether a path fits.</summary>
    /// <param name="path">Path relative to the measurement folder, with forward slashes.</param>
    public bool Matches(string path)
    {
        ArgumentNullException.ThrowIfNull(path);
        var names = path.Split('/');

        // reach[i]: the segments so far can have used up the first i names.
        var reach = new bool[names.Length + 1];
        reach[0] = true;
        foreach (var segment in _segments)
        {
            var next = new bool[names.Length + 1];
            for (var i = 0; i <= names.Length; i++)
            {
                next[i] = segment is "**"
                    ? reach[i] || (i > 0 && next[i - 1])
                    : i > 0 && reach[i - 1] && FileSystemName.MatchesSimpleExpression(segment, names[i - 1], ignoreCase: false);
            }

            reach = next;
        }

        return reach[^1];
    }

    /// <inheritdoc/>
    public override string ToString() => Text;
}
