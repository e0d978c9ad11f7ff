namespace RangeReduce.Reporting.Results;

/// <summary>Makes file names out of words of the user.</summary>
internal static class FileNames
{
    private const int Longest = 100;

    /// <summary>Keeps letters, digits, dot, plus, minus; everything else becomes a minus. Never empty, never hidden, never a path.</summary>
    public static string Safe(string words)
    {
        var name = string.Concat(words.Select(letter => char.IsAsciiLetterOrDigit(letter) || letter is '.' or '+' or '-' ? letter : '-')).Trim('.', '-');
        name = name.Length > Longest ? name[..Longest] : name;
        return name.Length == 0 ? "unnamed" : name;
    }
}
