namespace RangeReduce.Reduction.Sphere;

/// <summary>Clenshaw-Curtis weights for an integral of U sin θ dθ from 0 to 180 degrees on equal steps (standard numerical texts).</summary>
public static class ClenshawCurtis
{
    /// <summary>Gives the weights of the samples at k · 180/N degrees, k = 0 to N; they replace sin θ dθ and add to 2.</summary>
    /// <param name="intervals">N, even and at least 2.</param>
    /// <exception cref="ArgumentException">N is odd or too small.</exception>
    public static double[] Weights(int intervals)
    {
        if (intervals < 2 || intervals % 2 != 0)
        {
            throw new ArgumentException("The number of intervals must be even.", nameof(intervals));
        }

        var weights = new double[intervals + 1];
        for (var k = 0; k <= intervals; k++)
        {
            var sum = 0.0;
            for (var j = 0; j <= intervals / 2; j++)
            {
                var factor = j == 0 || j == intervals / 2 ? 1.0 : 2.0;
                sum += factor * Math.Cos(2.0 * Math.PI * j * k / intervals) / (1.0 - (4.0 * j * j));
            }

            weights[k] = sum * (k == 0 || k == intervals ? 1.0 : 2.0) / intervals;
        }

        return weights;
    }
}
