namespace RangeReduce.Patterns.Tables;

/// <summary>Rows on consecutive lines whose keys step evenly through the distinct values.</summary>
/// <param name="Line">Line of the first row.</param>
/// <param name="Frequency">Index of the frequency of the first row.</param>
/// <param name="First">Index of the theta-like angle of the first row.</param>
/// <param name="Second">Index of the phi-like angle of the first row.</param>
/// <param name="Count">Number of rows.</param>
/// <param name="FrequencyStep">Step of the index of the frequency from row to row: -1, 0 or 1.</param>
/// <param name="FirstStep">Step of the index of the theta-like angle.</param>
/// <param name="SecondStep">Step of the index of the phi-like angle.</param>
internal readonly record struct SampleRun(int Line, int Frequency, int First, int Second, int Count, sbyte FrequencyStep, sbyte FirstStep, sbyte SecondStep)
{
    /// <summary>Gives the index of one key of the first row.</summary>
    public int Start(int slot) => slot == TableKey.Frequency ? Frequency : slot == TableKey.First ? First : Second;

    /// <summary>Gives the step of the index of one key.</summary>
    public int Step(int slot) => slot == TableKey.Frequency ? FrequencyStep : slot == TableKey.First ? FirstStep : SecondStep;
}
