namespace RangeReduce.Diagnostics;

/// <summary>Says that measurement data or a manifest is wrong, in one sentence that tells where, what, what was due and what to do.</summary>
/// <remarks>This is the only exception that a user can cause by the content of a folder; anything else that escapes is a defect.</remarks>
public sealed class MeasurementDataException : Exception
{
    /// <summary>Makes the error.</summary>
    /// <param name="place">Where the fault stands.</param>
    /// <param name="code">A short stable name of the kind of fault, such as <c>bad-number</c>.</param>
    /// <param name="found">What stands there, shortened and with control characters escaped.</param>
    /// <param name="expected">What was expected in its place.</param>
    /// <param name="advice">What the user can do about it, as a sentence.</param>
    public MeasurementDataException(SourcePlace place, string code, string found, string expected, string advice)
        : base($"{place}: found {found}, expected {expected}. {advice}")
    {
        Place = place;
        Code = code;
        Found = found;
        Expected = expected;
        Advice = advice;
    }

    /// <summary>Gets the place of the fault, for programs that jump to it.</summary>
    public SourcePlace Place { get; }

    /// <summary>Gets the short stable name of the kind of fault.</summary>
    public string Code { get; }

    /// <summary>Gets what was found.</summary>
    public string Found { get; }

    /// <summary>Gets what was expected.</summary>
    public string Expected { get; }

    /// <summary>Gets what to do.</summary>
    public string Advice { get; }

    /// <summary>Gets further errors that were found in the same go, in the order of their places; empty where this is the only one.</summary>
    public IReadOnlyList<MeasurementDataException> Others { get; init; } = [];

    /// <summary>Gives the error as a remark of the severity <see cref="RemarkSeverity.Fault"/>, for a run that goes on without the file.</summary>
    public Remark ToRemark() => new(RemarkSeverity.Fault, Code, $"Found {Found}, expected {Expected}. {Advice}", Place);
}
