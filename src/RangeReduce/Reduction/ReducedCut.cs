using RangeReduce.Patterns;
using RangeReduce.Quantities;
using RangeReduce.Runs;

namespace RangeReduce.Reduction;

/// <summary>A cut in all the components that its data allow, over [frequency, angle].</summary>
/// <remarks>A component that cannot be known is null: dual-linear levels without phase have no right and left, dual-circular levels no theta and phi.</remarks>
public sealed class ReducedCut
{
    private ReducedCut(StateCut source) => Source = source;

    /// <summary>Gets the cut that it was made of, and whose it is.</summary>
    public StateCut Source { get; }

    /// <summary>Gets the cut that it was made of.</summary>
    public PatternCut Cut => Source.Cut;

    /// <summary>Gets the right-hand component over [frequency, angle]; null where it cannot be known.</summary>
    public PatternChannel? Right { get; private init; }

    /// <summary>Gets the left-hand component over [frequency, angle]; null where it cannot be known.</summary>
    public PatternChannel? Left { get; private init; }

    /// <summary>Gets the theta component over [frequency, angle]; null where it cannot be known.</summary>
    public PatternChannel? Theta { get; private init; }

    /// <summary>Gets the phi component over [frequency, angle]; null where it cannot be known.</summary>
    public PatternChannel? Phi { get; private init; }

    /// <summary>Gives whether two orthogonal components are there, so that total power is known.</summary>
    public bool HasTotal => Cut is { First: not null, Second: not null };

    /// <summary>Gives whether the polarization ellipse is known, apart from its tilt.</summary>
    public bool HasEllipse => Right is not null && Left is not null;

    /// <summary>Gives whether the tilt of the ellipse is known as well.</summary>
    public bool HasTilt => Right is { HasPhase: true } && Left is { HasPhase: true };

    /// <summary>Gives the components that are known, total included.</summary>
    public IEnumerable<FieldComponent> Components =>
        new[] { FieldComponent.Right, FieldComponent.Left, FieldComponent.Theta, FieldComponent.Phi, FieldComponent.Total }
            .Where(component => component == FieldComponent.Total ? HasTotal : Channel(component) is not null);

    /// <summary>Splits a cut into its components.</summary>
    public static ReducedCut Of(StateCut source)
    {
        ArgumentNullException.ThrowIfNull(source);
        var cut = source.Cut;
        if (cut.Basis == PolarizationBasis.ThetaPhi)
        {
            if (!cut.IsComplex)
            {
                return new(source) { Theta = cut.First, Phi = cut.Second };
            }

            var (right, left) = CircularSplit.ToCircular(cut.First!, cut.Second!);
            return new(source) { Theta = cut.First, Phi = cut.Second, Right = right, Left = left };
        }

        if (!cut.IsComplex)
        {
            return new(source) { Right = cut.First, Left = cut.Second };
        }

        var (theta, phi) = CircularSplit.ToLinear(cut.First!, cut.Second!);
        return new(source) { Right = cut.First, Left = cut.Second, Theta = theta, Phi = phi };
    }

    /// <summary>Gives the samples of a component over [frequency, angle]; null where it cannot be known.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The component is not right, left, theta or phi.</exception>
    public PatternChannel? Channel(FieldComponent component) => component switch
    {
        FieldComponent.Right => Right,
        FieldComponent.Left => Left,
        FieldComponent.Theta => Theta,
        FieldComponent.Phi => Phi,
        _ => throw new ArgumentOutOfRangeException(nameof(component), component, "A cut has right, left, theta and phi."),
    };
}
