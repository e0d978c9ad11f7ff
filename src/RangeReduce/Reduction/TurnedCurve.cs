namespace RangeReduce.Reduction;

/// <summary>A curve along a cut, turned so that a chosen sample is in the middle; a closed turn is joined at its seam.</summary>
/// <remarks>Beamwidths and lobes do not care where the positioner started: a beam across ±180 degrees is as whole as one across 0.</remarks>
public sealed class TurnedCurve
{
    private const double FullTurnDeg = 360.0;

    private TurnedCurve(double[] angleDeg, double[] y, int middle, bool isClosed) => (AngleDeg, Y, Middle, IsClosed) = (angleDeg, y, middle, isClosed);

    /// <summary>Gets the angles in degrees, strictly rising; they may pass 180 or −180.</summary>
    public double[] AngleDeg { get; }

    /// <summary>Gets the ordinates.</summary>
    public double[] Y { get; }

    /// <summary>Gets the index of the chosen sample.</summary>
    public int Middle { get; }

    /// <summary>Gets whether the cut is a closed turn: then the curve reaches 180 degrees to either side, and first and last sample are the same direction.</summary>
    public bool IsClosed { get; }

    /// <summary>Tells whether the angles make a closed turn, the repeated direction given or left out.</summary>
    public static bool ClosesTurn(double[] angleDeg)
    {
        ArgumentNullException.ThrowIfNull(angleDeg);
        return angleDeg.Length > 2 && (angleDeg[^1] - angleDeg[0]) + LargestStepDeg(angleDeg) >= FullTurnDeg - 1e-6;
    }

    /// <summary>Turns a curve.</summary>
    /// <param name="angleDeg">Angles in degrees, strictly rising.</param>
    /// <param name="y">Ordinates, as many.</param>
    /// <param name="chosen">Index of the sample to put in the middle.</param>
    public static TurnedCurve About(double[] angleDeg, double[] y, int chosen)
    {
        ArgumentNullException.ThrowIfNull(angleDeg);
        ArgumentNullException.ThrowIfNull(y);
        if (!ClosesTurn(angleDeg))
        {
            return new(angleDeg, y, chosen, isClosed: false);
        }

        // The direction at both ends of a repeated turn is one direction: keep it once.
        var count = angleDeg[^1] - angleDeg[0] > FullTurnDeg - 1e-6 ? angleDeg.Length - 1 : angleDeg.Length;
        chosen %= count;
        var before = count / 2;
        var (turned, values) = (new double[count + 1], new double[count + 1]);
        for (var i = 0; i <= count; i++)
        {
            var at = chosen - before + i;
            var wraps = (int)Math.Floor((double)at / count);
            var index = at - (wraps * count);
            turned[i] = angleDeg[index] + (wraps * FullTurnDeg);
            values[i] = y[index];
        }

        return new(turned, values, before, isClosed: true);
    }

    private static double LargestStepDeg(double[] angleDeg)
    {
        var largest = 0.0;
        for (var i = 1; i < angleDeg.Length; i++)
        {
            largest = Math.Max(largest, angleDeg[i] - angleDeg[i - 1]);
        }

        return largest;
    }
}
