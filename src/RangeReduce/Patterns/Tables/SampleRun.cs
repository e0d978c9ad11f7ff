namespace RangeReduce.Patterns.Tables;

/// <summary>Rows on consecutive lines whose keys step evenly through the distinct values.</summary>
/// <param name="Line">Line of the first row.</param>
/// <param name="Frequency">Index of the frequency of the first row.</param>
/// <param name="First">Index of the theta-like angle of the first row.</param>
/// <param name="Second">Index of the phi-like angle of the first row.</param>
internal record struct SampleRun(int Line, int Frequency, int First, int Second)
{
    /// <summary>Gets the number of rows.</summary>
    public int Count { get; private set; } = 1;

    /// <summary>Gets the step of the index of the frequency from row to row: -1, 0 or 1.</summary>
    public sbyte FrequencyStep { get; private set; }

    /// <summary>Gets the step of the index of the theta-like angle.</summary>
    public sbyte FirstStep { get; private set; }

    /// <summary>Gets the step of the index of the phi-like angle.</summary>
    public sbyte SecondStep { get; private set; }

    /// <summary>Gives the index of one key of the first row.</summary>
    public readonly int Start(int slot) => slot == TableKey.Frequency ? Frequency : slot == TableKey.First ? First : Second;

    /// <summary>Gives the step of the index of one key.</summary>
    public readonly int Step(int slot) => slot == TableKey.Frequency ? FrequencyStep : slot == TableKey.First ? FirstStep : SecondStep;

    /// <summary>Takes one more row where it continues the steps.</summary>
    public bool TryExtend(int line, int frequency, int first, int second)
    {
        if (line != Line + Count)
        {
            return false;
        }

        if (Count == 1)
        {
            var (df, da, db) = (frequency - Frequency, first - First, second - Second);
            if (df is < -1 or > 1 || da is < -1 or > 1 || db is < -1 or > 1)
            {
                return false;
            }

            (FrequencyStep, FirstStep, SecondStep) = ((sbyte)df, (sbyte)da, (sbyte)db);
        }
        else if (frequency != Frequency + (Count * FrequencyStep) || first != First + (Count * FirstStep) || second != Second + (Count * SecondStep))
        {
            return false;
        }

        Count++;
        return true;
    }
}
