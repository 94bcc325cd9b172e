namespace MeshSection.Torsion;

/// <summary>Why torsion and shear of a section cannot be analysed.</summary>
public enum TorsionFault
{
    /// <summary>
    /// The section is in separate pieces: nothing passes shear from one to another, so it has no one torsion constant.
    /// </summary>
    Disconnected,

    /// <summary>Poisson's ratio lies outside of (-1, 0.5].</summary>
    PoissonRatio,
}

/// <summary>Torsion and shear of a section cannot be analysed.</summary>
public sealed class TorsionException : Exception
{
    /// <summary>Makes the exception.</summary>
    /// <param name="fault">What is wrong.</param>
    /// <param name="value">The number of pieces, or Poisson's ratio.</param>
    public TorsionException(TorsionFault fault, double value)
        : base(FormattableString.Invariant($"{fault}: {value}"))
    {
        Fault = fault;
        Value = value;
    }

    /// <summary>What is wrong.</summary>
    public TorsionFault Fault { get; }

    /// <summary>The number of pieces, or Poisson's ratio.</summary>
    public double Value { get; }
}
