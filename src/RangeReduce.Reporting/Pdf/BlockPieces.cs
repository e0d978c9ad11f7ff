using OxyPlot;

using RangeReduce.Reporting.Model;
using RangeReduce.Reporting.Plots;

namespace RangeReduce.Reporting.Pdf;

/// <summary>Turns the blocks of a report into pieces of a page.</summary>
internal sealed class BlockPieces(float width, StateStyles styles)
{
    private const float BodySize = 8.6f;
    private const float NoteSize = 7.4f;

    /// <summary>Gives the pieces of a whole report.</summary>
    public IReadOnlyList<FlowPiece> Of(ReportModel model)
    {
        var pieces = new List<FlowPiece>
        {
            new TextPiece(RichText.Strong(model.Title), 19f, width) { KeepWithNext = true },
        };
        if (model.Subtitle.Length > 0)
        {
            pieces.Add(new TextPiece(RichText.Quiet(model.Subtitle), 9f, width) { KeepWithNext = true });
        }

        var number = 0;
        foreach (var section in model.Sections)
        {
            number++;
            var title = $"{Formatting.NumberText.Fixed(number, 0)}{Formatting.UnitText.NoBreakSpace} {section.Title}";
            pieces.Add(new TextPiece(RichText.Strong(title), 13.5f, width)
            {
                KeepWithNext = true,
                SpaceBefore = 22f,
                StartsPage = number > 1 && section.StartsPage,
                Anchor = section.Id,
                Bookmark = new Bookmark(title, 1, section.Id),
            });
            AddBlocks(pieces, section.Blocks);
        }

        return pieces;
    }

    private void AddBlocks(List<FlowPiece> pieces, IReadOnlyList<ReportBlock> blocks)
    {
        foreach (var block in blocks)
        {
            switch (block)
            {
                case HeadingBlock heading:
                    pieces.Add(new TextPiece(RichText.Strong(heading.Text), 10.5f, width, MarkOf(heading.State))
                    {
                        KeepWithNext = true,
                        SpaceBefore = 13f,
                        Anchor = heading.Id,
                        Bookmark = new Bookmark(heading.Text, 2, heading.Id),
                    });
                    break;
                case ParagraphBlock paragraph:
                    pieces.Add(new TextPiece(paragraph.Text, paragraph.Lead ? 9.6f : BodySize, width, MarkOf(paragraph.State)) { SpaceBefore = 5f, KeepWithNext = paragraph.KeepWithNext });
                    break;
                case PlotRowBlock row:
                    pieces.Add(new PlotRowPiece(row.Plots, width) { SpaceBefore = 9f });
                    break;
                case RemarkListBlock remarks:
                    pieces.AddRange(remarks.Items.Select(item => new RemarkPiece(item, width) { SpaceBefore = 3.5f }));
                    break;
                case TableBlock table:
                    AddTable(pieces, table);
                    break;
                default:
                    throw new InvalidOperationException($"No piece is known for {block.GetType().Name}.");
            }
        }
    }

    private void AddTable(List<FlowPiece> pieces, TableBlock table)
    {
        if (table.Caption.Spans.Count > 0)
        {
            pieces.Add(new TextPiece(table.Caption, BodySize - 0.4f, width) { KeepWithNext = true, SpaceBefore = 10f });
        }

        var layout = new TableLayout(table, width, styles);
        var head = new TableRowPiece(layout, [.. table.Columns.Select(column => column.Head.AsStrong())], isHead: true, startsGroup: false) { KeepWithNext = true, SpaceBefore = 2f };
        pieces.Add(head);
        for (var at = 0; at < table.Rows.Count; at++)
        {
            var row = table.Rows[at];

            // Neither the first nor the last row of a table stands alone on a page; notes stay with the last.
            var tied = at == 0 || at == table.Rows.Count - 2 || (at == table.Rows.Count - 1 && table.Notes.Count > 0);
            pieces.Add(new TableRowPiece(layout, row.Cells, isHead: false, row.StartsGroup && at > 0)
            {
                KeepWithNext = tied && !(at == table.Rows.Count - 1 && table.Notes.Count == 0),
                Head = head,
                Anchor = row.Id,
            });
        }

        for (var at = 0; at < table.Notes.Count; at++)
        {
            pieces.Add(new TextPiece(table.Notes[at], NoteSize, width) { SpaceBefore = at == 0 ? 4f : 1f });
        }
    }

    private (MarkerType Marker, OxyColor Color)? MarkOf(string? state) => state is null ? null : (styles.MarkerOf(state), styles.ColorOf(state));
}
