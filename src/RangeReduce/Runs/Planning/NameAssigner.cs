using RangeReduce.Diagnostics;
using RangeReduce.Quantities;
using RangeReduce.Runs.Discovery;

namespace RangeReduce.Runs.Planning;

/// <summary>Assigns files by the words in their names, where no manifest does.</summary>
internal sealed class NameAssigner
{
    /// <summary>Name of the state where no name tells one.</summary>
    public const string OnlyState = "antenna";

    private readonly string[] _folderStates;
    private readonly List<Remark> _remarks;

    /// <summary>Learns the states that folders name, so that file names elsewhere can be held against them.</summary>
    public NameAssigner(IEnumerable<string> dataPaths, List<Remark> remarks)
    {
        _remarks = remarks;
        _folderStates = [.. dataPaths.Select(NameFacts.Of).Where(facts => !facts.IsGainStandard).Select(facts => facts.FolderState).OfType<string>().Distinct(StringComparer.OrdinalIgnoreCase)];
    }

    /// <summary>Assigns a data file.</summary>
    /// <param name="path">Path relative to the measurement folder.</param>
    /// <param name="guess">What its content seems to be.</param>
    public Assignment Assign(string path, InputKind guess)
    {
        var facts = NameFacts.Of(path);
        if (guess == InputKind.GainTable)
        {
            return new(InputKind.GainTable, null, null, "file content") { IsOfGainStandard = true };
        }

        if (facts.IsGainStandard)
        {
            if (facts.IsSimulated)
            {
                _remarks.Add(new(RemarkSeverity.Doubt, "simulated-standard", "The names speak of a simulation and of the gain standard; only a measured standard can be compared with, so the file was not used.", new(path)));
                return Assignment.Other("simulated gain standard");
            }

            return new(guess == InputKind.Sweep ? InputKind.Sweep : InputKind.GainStandardCut, null, DataSource.Measured, "name says gain standard") { IsOfGainStandard = true };
        }

        var (state, reason) = StateOf(path, facts);
        return new(guess, state, facts.IsSimulated ? DataSource.Simulated : DataSource.Measured, facts.IsSimulated ? $"{reason}, name says simulated" : reason) { IsKindOpen = true };
    }

    /// <summary>Gives the hand that a state's name says it is meant to have; null where it says none.</summary>
    public static Hand? HandOf(string state) => state.ToUpperInvariant() switch
    {
        "RIGHT" or "RHCP" or "RIGHT-HAND" => Hand.Right,
        "LEFT" or "LHCP" or "LEFT-HAND" => Hand.Left,
        _ => null,
    };

    private (string State, string Reason) StateOf(string path, NameFacts facts)
    {
        if (facts.FolderState is { } folder)
        {
            var state = Array.Find(_folderStates, known => string.Equals(known, folder, StringComparison.OrdinalIgnoreCase)) ?? folder;
            if (facts.NameState is { } name && KnownIn(name) is { } other && !string.Equals(other, state, StringComparison.Ordinal))
            {
                _remarks.Add(new(RemarkSeverity.Doubt, "state-contradiction", $"The folder says state {state}, the file name says {other}; the folder was believed.", new(path), state));
            }

            return (state, "folder name");
        }

        if (facts.NameState is { } words)
        {
            return (KnownIn(words) ?? words, "file name");
        }

        if (_folderStates.Length == 1)
        {
            return (_folderStates[0], "only state");
        }

        if (_folderStates.Length > 0)
        {
            _remarks.Add(new(RemarkSeverity.Doubt, "state-unnamed", $"Neither folder nor file name tells the state, while other files have one; it was called {OnlyState}.", new(path), OnlyState));
        }

        return (OnlyState, "no name tells a state");
    }

    /// <summary>Gives the folder state whose words all stand in a file name; null where not exactly one does.</summary>
    private string? KnownIn(string name)
    {
        var words = NameWords.Of(name);
        var found = _folderStates.Where(state => NameWords.Of(state).All(word => words.Contains(word, StringComparer.OrdinalIgnoreCase))).ToArray();
        return found.Length == 1 ? found[0] : null;
    }
}
