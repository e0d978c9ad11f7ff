using RangeReduce.Comparison;
using RangeReduce.Diagnostics;
using RangeReduce.Reporting.Formatting;
using RangeReduce.Reporting.Model;

namespace RangeReduce.Reporting.Sections;

/// <summary>Part 1: what a reader needs who stops here.</summary>
internal static class VerdictSection
{
    /// <summary>Makes the section.</summary>
    public static ReportSection Build(ReportContext context)
    {
        var blocks = new List<ReportBlock>();
        blocks.AddRange(context.States.Select(state => new ParagraphBlock(StateSentence.Of(context, state)) { Lead = true, State = state }));
        if (RequirementSummary(context.Reduced.Requirements) is { } summary)
        {
            blocks.Add(new ParagraphBlock(summary) { Lead = true });
        }

        blocks.Add(new ParagraphBlock(RichText.Strong("Conventions: ").Then(Conventions.Sentence(context.Run))));
        blocks.AddRange(StateTable.Blocks(context));
        AddRequirements(blocks, context.Reduced.Requirements);
        AddRemarks(blocks, context.Reduced.Remarks);
        return new("verdict", "Verdict", blocks);
    }

    private static RichText? RequirementSummary(IReadOnlyList<RequirementOutcome> outcomes)
    {
        if (outcomes.Count == 0)
        {
            return null;
        }

        string Count(RequirementVerdict verdict) => NumberText.Fixed(outcomes.Count(outcome => outcome.Verdict == verdict), 0);
        var spans = new List<TextSpan> { new($"Of {NumberText.Fixed(outcomes.Count, 0)} requirements ") };
        spans.Add(new($"{Count(RequirementVerdict.Met)} met") { Tone = TextTone.Good, Strong = true });
        spans.Add(new(", "));
        spans.Add(new($"{Count(RequirementVerdict.NotMet)} not met") { Tone = TextTone.Bad, Strong = true });
        spans.Add(new(", "));
        spans.Add(new($"{Count(RequirementVerdict.Undecided)} undecided") { Tone = TextTone.Doubt, Strong = true });
        spans.Add(new("."));
        return new(spans);
    }

    private static void AddRequirements(List<ReportBlock> blocks, IReadOnlyList<RequirementOutcome> outcomes)
    {
        blocks.Add(new HeadingBlock("requirements", "Requirements"));
        if (outcomes.Count == 0)
        {
            blocks.Add(new ParagraphBlock("The manifest states no requirements."));
            return;
        }

        blocks.Add(new TableBlock(
            RichText.Empty,
            [new("No."), new("Requirement"), new("Outcome"), new("Worst", ColumnAlignment.DecimalPoint), new("Margin", ColumnAlignment.DecimalPoint), new("Unit"), new("Where or why")],
            [.. outcomes.Select(Row)])
        {
            Notes = [RichText.Quiet("The margin is the distance of the worst value from the bound, positive on the good side. Undecided: the data or their uncertainty do not decide.")],
        });
    }

    private static TableRow Row(RequirementOutcome outcome)
    {
        var quantity = outcome.Requirement.Quantity;
        var (word, tone) = outcome.Verdict switch
        {
            RequirementVerdict.Met => ("met", TextTone.Good),
            RequirementVerdict.NotMet => ("not met", TextTone.Bad),
            _ => ("undecided", TextTone.Doubt),
        };
        return new(
        [
            outcome.Requirement.Id,
            Words.Capital(outcome.Text),
            new RichText([new TextSpan(word.Replace(' ', UnitText.NoBreakSpace)) { Tone = tone, Strong = true }]),
            FigureText.Plain(outcome.Worst, quantity),
            FigureText.Plain(outcome.Margin, quantity),
            UnitText.Of(quantity, outcome.Requirement.Component),
            outcome.Reason,
        ]);
    }

    private static void AddRemarks(List<ReportBlock> blocks, IReadOnlyList<Remark> remarks)
    {
        blocks.Add(new HeadingBlock("remarks", "Remarks"));
        if (remarks.Count == 0)
        {
            blocks.Add(new ParagraphBlock("There are no remarks: every file was read as stated, and nothing was left out."));
            return;
        }

        blocks.Add(new RemarkListBlock([.. remarks.OrderByDescending(remark => remark.Severity).Select(Item)]));
    }

    private static RemarkItem Item(Remark remark)
    {
        var (label, tone) = remark.Severity switch
        {
            RemarkSeverity.Fault => ("fault", TextTone.Bad),
            RemarkSeverity.Doubt => ("doubt", TextTone.Doubt),
            _ => ("note", TextTone.Quiet),
        };
        return new(label, tone, remark.Text, remark.Place is { } place ? place.ToString() : string.Empty);
    }
}
