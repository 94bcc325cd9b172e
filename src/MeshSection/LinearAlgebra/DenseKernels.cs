using System.Runtime.CompilerServices;
using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;

namespace MeshSection.LinearAlgebra;

/// <summary>
/// The dense inner loops of the factorisation, on matrices stored column by column. Compiled at once with full
/// optimisation: a short run must not spend its time in code that waits to be optimised. Each entry is summed in one
/// fixed order with fused operations, so that every processor gives the same bits.
/// </summary>
internal static class DenseKernels
{
    private const int Lanes = 4;

    /// <summary>
    /// C := C - A Bᵀ on and below the diagonal, with B the first <paramref name="columns"/> rows of A; entries above the
    /// diagonal may be overwritten.
    /// </summary>
    /// <param name="c">C, rows × columns.</param>
    /// <param name="columnLengthC">Distance between the columns of C.</param>
    /// <param name="a">A, rows × depth.</param>
    /// <param name="columnLengthA">Distance between the columns of A.</param>
    /// <param name="rows">Rows of A and C.</param>
    /// <param name="columns">Columns of C, at most <paramref name="rows"/>.</param>
    /// <param name="depth">Columns of A.</param>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    public static void SubtractProduct(
        Span<double> c, int columnLengthC, ReadOnlySpan<double> a, int columnLengthA, int rows, int columns, int depth)
    {
        ref var c0 = ref MemoryMarshal.GetReference(c);
        ref var a0 = ref MemoryMarshal.GetReference(a);
        var j = 0;
        for (; j + 4 <= columns; j += 4)
        {
            var i = j;
            for (; i + 2 * Lanes <= rows; i += 2 * Lanes)
            {
                Block8x4(ref Unsafe.Add(ref c0, i + j * columnLengthC), columnLengthC, ref Unsafe.Add(ref a0, i), ref Unsafe.Add(ref a0, j), columnLengthA, depth);
            }

            for (; i + Lanes <= rows; i += Lanes)
            {
                Block4x4(ref Unsafe.Add(ref c0, i + j * columnLengthC), columnLengthC, ref Unsafe.Add(ref a0, i), ref Unsafe.Add(ref a0, j), columnLengthA, depth);
            }

            for (; i < rows; i++)
            {
                for (var k = 0; k < 4; k++)
                {
                    Single(ref Unsafe.Add(ref c0, i + (j + k) * columnLengthC), ref Unsafe.Add(ref a0, i), ref Unsafe.Add(ref a0, j + k), columnLengthA, depth);
                }
            }
        }

        for (; j < columns; j++)
        {
            var i = j;
            for (; i + Lanes <= rows; i += Lanes)
            {
                Block4x1(ref Unsafe.Add(ref c0, i + j * columnLengthC), ref Unsafe.Add(ref a0, i), ref Unsafe.Add(ref a0, j), columnLengthA, depth);
            }

            for (; i < rows; i++)
            {
                Single(ref Unsafe.Add(ref c0, i + j * columnLengthC), ref Unsafe.Add(ref a0, i), ref Unsafe.Add(ref a0, j), columnLengthA, depth);
            }
        }
    }

    /// <summary>y := y - factor x.</summary>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    public static void Subtract(Span<double> y, ReadOnlySpan<double> x, double factor)
    {
        ref var y0 = ref MemoryMarshal.GetReference(y);
        ref var x0 = ref MemoryMarshal.GetReference(x);
        var minus = Vector256.Create(-factor);
        var i = 0;
        for (; i + Lanes <= x.Length; i += Lanes)
        {
            var sum = Vector256.FusedMultiplyAdd(
                Vector256.LoadUnsafe(ref x0, (nuint)i), minus, Vector256.LoadUnsafe(ref y0, (nuint)i));
            sum.StoreUnsafe(ref y0, (nuint)i);
        }

        for (; i < x.Length; i++)
        {
            y[i] = Math.FusedMultiplyAdd(-factor, x[i], y[i]);
        }
    }

    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private static void Block8x4(ref double c, int stepC, ref double a, ref double b, int stepA, int depth)
    {
        Vector256<double> s00 = default, s01 = default, s02 = default, s03 = default;
        Vector256<double> s10 = default, s11 = default, s12 = default, s13 = default;
        for (var p = 0; p < depth; p++)
        {
            var low = Vector256.LoadUnsafe(ref a);
            var high = Vector256.LoadUnsafe(ref a, Lanes);
            var b0 = Vector256.Create(b);
            s00 = Vector256.FusedMultiplyAdd(low, b0, s00);
            s10 = Vector256.FusedMultiplyAdd(high, b0, s10);
            var b1 = Vector256.Create(Unsafe.Add(ref b, 1));
            s01 = Vector256.FusedMultiplyAdd(low, b1, s01);
            s11 = Vector256.FusedMultiplyAdd(high, b1, s11);
            var b2 = Vector256.Create(Unsafe.Add(ref b, 2));
            s02 = Vector256.FusedMultiplyAdd(low, b2, s02);
            s12 = Vector256.FusedMultiplyAdd(high, b2, s12);
            var b3 = Vector256.Create(Unsafe.Add(ref b, 3));
            s03 = Vector256.FusedMultiplyAdd(low, b3, s03);
            s13 = Vector256.FusedMultiplyAdd(high, b3, s13);
            a = ref Unsafe.Add(ref a, stepA);
            b = ref Unsafe.Add(ref b, stepA);
        }

        Take(ref c, s00, s10);
        Take(ref Unsafe.Add(ref c, stepC), s01, s11);
        Take(ref Unsafe.Add(ref c, 2 * stepC), s02, s12);
        Take(ref Unsafe.Add(ref c, 3 * stepC), s03, s13);
    }

    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private static void Block4x4(ref double c, int stepC, ref double a, ref double b, int stepA, int depth)
    {
        Vector256<double> s0 = default, s1 = default, s2 = default, s3 = default;
        for (var p = 0; p < depth; p++)
        {
            var row = Vector256.LoadUnsafe(ref a);
            s0 = Vector256.FusedMultiplyAdd(row, Vector256.Create(b), s0);
            s1 = Vector256.FusedMultiplyAdd(row, Vector256.Create(Unsafe.Add(ref b, 1)), s1);
            s2 = Vector256.FusedMultiplyAdd(row, Vector256.Create(Unsafe.Add(ref b, 2)), s2);
            s3 = Vector256.FusedMultiplyAdd(row, Vector256.Create(Unsafe.Add(ref b, 3)), s3);
            a = ref Unsafe.Add(ref a, stepA);
            b = ref Unsafe.Add(ref b, stepA);
        }

        Take(ref c, s0);
        Take(ref Unsafe.Add(ref c, stepC), s1);
        Take(ref Unsafe.Add(ref c, 2 * stepC), s2);
        Take(ref Unsafe.Add(ref c, 3 * stepC), s3);
    }

    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private static void Block4x1(ref double c, ref double a, ref double b, int stepA, int depth)
    {
        var sum = Vector256<double>.Zero;
        for (var p = 0; p < depth; p++)
        {
            sum = Vector256.FusedMultiplyAdd(Vector256.LoadUnsafe(ref a), Vector256.Create(b), sum);
            a = ref Unsafe.Add(ref a, stepA);
            b = ref Unsafe.Add(ref b, stepA);
        }

        Take(ref c, sum);
    }

    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private static void Single(ref double c, ref double a, ref double b, int stepA, int depth)
    {
        var sum = 0.0;
        for (var p = 0; p < depth; p++)
        {
            sum = Math.FusedMultiplyAdd(a, b, sum);
            a = ref Unsafe.Add(ref a, stepA);
            b = ref Unsafe.Add(ref b, stepA);
        }

        c -= sum;
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static void Take(ref double c, Vector256<double> sum) => (Vector256.LoadUnsafe(ref c) - sum).StoreUnsafe(ref c);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static void Take(ref double c, Vector256<double> low, Vector256<double> high)
    {
        Take(ref c, low);
        Take(ref Unsafe.Add(ref c, Lanes), high);
    }
}
