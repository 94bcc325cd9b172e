namespace MeshSection.LinearAlgebra;

/// <summary>A matrix that must be positive definite is not: the system is singular or indefinite.</summary>
public sealed class NotPositiveDefiniteException : Exception
{
    /// <summary>Makes the exception.</summary>
    /// <param name="unknown">Index of the unknown whose pivot failed.</param>
    /// <param name="pivot">The pivot: what is left of its diagonal entry once the unknowns before it are eliminated.</param>
    /// <param name="diagonal">The diagonal entry.</param>
    public NotPositiveDefiniteException(int unknown, double pivot, double diagonal)
        : base(FormattableString.Invariant(
            $"The matrix is not positive definite: unknown {unknown} has the pivot {pivot}, its diagonal entry is {diagonal}."))
    {
        Unknown = unknown;
        Pivot = pivot;
        Diagonal = diagonal;
    }

    /// <summary>Index of the unknown whose pivot failed.</summary>
    public int Unknown { get; }

    /// <summary>The pivot: what is left of the diagonal entry once the unknowns before it are eliminated.</summary>
    public double Pivot { get; }

    /// <summary>The diagonal entry.</summary>
    public double Diagonal { get; }
}
