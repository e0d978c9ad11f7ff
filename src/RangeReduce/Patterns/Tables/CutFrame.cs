using System.Globalization;

namespace RangeReduce.Patterns.Tables;

/// <summary>How the two angles of a table become cuts: which one moves, and what the positioner's angles are on the antenna's sphere.</summary>
/// <param name="Axis">The angle that moves.</param>
/// <param name="MovingSlot">Slot of the key that moves.</param>
/// <param name="MovingDeg">Angle along the cut for each distinct value of the moving key.</param>
/// <param name="FixedDeg">Fixed angle for each distinct value of the other key.</param>
internal sealed record CutFrame(CutAxis Axis, int MovingSlot, double[] MovingDeg, double[] FixedDeg)
{
    /// <summary>Gets the slot of the key that is fixed along a cut.</summary>
    public int FixedSlot => MovingSlot == TableKey.First ? TableKey.Second : TableKey.First;

    /// <summary>Decides from the angles that occur.</summary>
    public static CutFrame Choose(TableContext context, TablePlan plan, SampleStore store)
    {
        var first = store.Keys[TableKey.First].Values;
        var second = store.Keys[TableKey.Second].Values;
        var (firstKind, secondKind) = (plan.Keys[TableKey.First].Kind, plan.Keys[TableKey.Second].Kind);
        if (firstKind == HeadingKind.Azimuth && secondKind == HeadingKind.Elevation)
        {
            return ElevationOverAzimuth(context, first, second);
        }

        if (firstKind == HeadingKind.Unknown && secondKind == HeadingKind.Unknown)
        {
            context.Note("single-angle", "The table gives no angle: its samples were taken as a cut with the single angle 0 degrees.");
            return new(CutAxis.Theta, TableKey.First, [0.0], [double.NaN]);
        }

        // A positioner's azimuth or elevation that moves alone is theta; only the frame of the run can tell more.
        if (firstKind is HeadingKind.Azimuth or HeadingKind.Elevation or HeadingKind.Angle)
        {
            var name = firstKind == HeadingKind.Angle ? "angle of the positioner" : firstKind.ToString().ToLowerInvariant();
            context.Note("positioner-angle", $"The {name} was taken for theta, with 0 degrees on the antenna's axis.");
        }

        var (distinctFirst, distinctSecond) = (Distinct(first), Distinct(second));
        var phiMoves = distinctSecond > 1 && (distinctFirst <= 1 || (distinctFirst <= 3 && distinctSecond > 2 * distinctFirst));
        if (distinctFirst > 1 && distinctSecond > 1)
        {
            context.Note("both-angles-vary", string.Create(CultureInfo.InvariantCulture, $"Both angles vary ({distinctFirst} of theta, {distinctSecond} of phi): read as cuts of constant {(phiMoves ? "theta, along phi" : "phi, along theta")}."));
        }

        return phiMoves
            ? new(CutAxis.Phi, TableKey.Second, [.. second], [.. first])
            : new(CutAxis.Theta, TableKey.First, WholeTurn(context, [.. first]), OneTurn(context, second));
    }

    private static CutFrame ElevationOverAzimuth(TableContext context, List<double> azimuth, List<double> elevation)
    {
        var (distinctAzimuth, distinctElevation) = (Distinct(azimuth), Distinct(elevation));
        var elevationMoves = distinctElevation > 1 && (distinctAzimuth <= 1 || (distinctAzimuth <= 3 && distinctElevation > 2 * distinctAzimuth));
        if (!elevationMoves && distinctElevation == 1 && elevation[0] is 0.0)
        {
            context.Note("principal-plane", "The azimuth cut at elevation 0 was taken for theta at phi 0, with 0 degrees on the antenna's axis.");
            return new(CutAxis.Theta, TableKey.First, WholeTurn(context, [.. azimuth]), [0.0]);
        }

        if (elevationMoves && distinctAzimuth == 1 && azimuth[0] is 0.0)
        {
            context.Note("principal-plane", "The elevation cut at azimuth 0 was taken for theta at phi 90 degrees, with 0 degrees on the antenna's axis.");
            return new(CutAxis.Theta, TableKey.Second, WholeTurn(context, [.. elevation]), [90.0]);
        }

        context.Doubt("vertical-pole", "Azimuth and elevation off the principal planes were read with the pole along the azimuth axis: theta is 90 degrees minus elevation, phi is azimuth.");
        var theta = elevation.ConvertAll(deg => 90.0 - deg).ToArray();
        return elevationMoves
            ? new(CutAxis.Theta, TableKey.Second, WholeTurn(context, theta), [.. azimuth])
            : new(CutAxis.Phi, TableKey.First, [.. azimuth], theta);
    }

    private static int Distinct(List<double> values) => values.Count(value => !double.IsNaN(value));

    /// <summary>Brings theta from 0..360 to -180..180, so that the antenna's axis lies inside the cut.</summary>
    private static double[] WholeTurn(TableContext context, double[] deg)
    {
        if (!Array.Exists(deg, value => value is > 180.0 or < -180.0))
        {
            return deg;
        }

        context.Note("whole-turn", "Angles beyond 180 degrees were brought into -180 to 180 by whole turns (theta 270 is -90 in the same cut).");
        return Array.ConvertAll(deg, value => double.IsNaN(value) ? value : Reduced(value));
    }

    /// <summary>Takes phi 360 for phi 0.</summary>
    private static double[] OneTurn(TableContext context, List<double> deg)
    {
        if (!deg.Exists(value => value >= 360.0))
        {
            return [.. deg];
        }

        context.Note("whole-turn", "Fixed angles of 360 degrees and more were brought below 360 by whole turns.");
        return [.. deg.Select(value => value >= 360.0 ? value - 360.0 : value)];
    }

    private static double Reduced(double deg)
    {
        var turn = deg;
        while (turn > 180.0)
        {
            turn -= 360.0;
        }

        while (turn < -180.0)
        {
            turn += 360.0;
        }

        return turn;
    }
}
