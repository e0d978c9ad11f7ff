using System.Globalization;
using System.Text;

namespace RangeReduce.Reporting.Sections;

/// <summary>Turns names of states into parts of file names and anchors.</summary>
/// <param name="states">Names of the states in order.</param>
internal sealed class FileNames(IReadOnlyList<string> states)
{
    private readonly Dictionary<string, string> _names = Make(states);

    /// <summary>Gives the part for a state: small letters, digits and hyphens, different for different states.</summary>
    public string Of(string state) => _names[state];

    private static Dictionary<string, string> Make(IReadOnlyList<string> states)
    {
        var names = new Dictionary<string, string>(StringComparer.Ordinal);
        var taken = new HashSet<string>(StringComparer.Ordinal);
        for (var at = 0; at < states.Count; at++)
        {
            var plain = Plain(states[at]);
            var name = plain.Length > 0 && taken.Add(plain) ? plain : string.Create(CultureInfo.InvariantCulture, $"{(plain.Length > 0 ? plain : "state")}-{at + 1}");
            taken.Add(name);
            names[states[at]] = name;
        }

        return names;
    }

    private static string Plain(string name)
    {
        var plain = new StringBuilder();
        foreach (var letter in name)
        {
            if (char.IsAsciiLetterOrDigit(letter))
            {
                plain.Append(char.ToLowerInvariant(letter));
            }
            else if (plain.Length > 0 && plain[^1] != '-')
            {
                plain.Append('-');
            }
        }

        return plain.ToString().Trim('-');
    }
}
