using System.Numerics;

namespace MeshSection.Meshing;

/// <summary>Orders points along a Hilbert curve, so that neighbours in the order are neighbours in the plane.</summary>
internal static class HilbertOrder
{
    /// <summary>Cells along each axis, as a power of two, where details may be a millionth of the whole.</summary>
    private const int FineBits = 24;

    /// <summary>Cells along each axis, as a power of two, that suffice to keep neighbours close in memory.</summary>
    private const int CoarseBits = 16;

    /// <summary>The points' indices in the order in which their cells lie along the curve; ties by index.</summary>
    /// <param name="xy">Coordinates, x of point i at 2i and y at 2i + 1.</param>
    /// <param name="count">How many points there are.</param>
    public static int[] Along(double[] xy, int count) => Sorted(Keys(xy, count, CoarseBits));

    /// <summary>
    /// The points' indices in rounds that double in size, each round chosen by a fixed hash and sorted along the curve:
    /// keeps incremental insertion near n log n where the curve alone would not [AmentaChoiRote2003].
    /// </summary>
    /// <param name="xy">Coordinates, x of point i at 2i and y at 2i + 1.</param>
    /// <param name="count">How many points there are.</param>
    public static int[] InRounds(double[] xy, int count)
    {
        ulong[] keys = Keys(xy, count, FineBits);
        int rounds = BitOperations.Log2((uint)count | 1);
        for (int i = 0; i < count; i++)
        {
            int halvings = Math.Min(BitOperations.TrailingZeroCount(Hash((uint)i)), rounds);
            keys[i] |= (ulong)(rounds - halvings) << (2 * FineBits);
        }
        return Sorted(keys);
    }

    private static ulong[] Keys(double[] xy, int count, int bits)
    {
        double left = double.PositiveInfinity;
        double bottom = double.PositiveInfinity;
        double right = double.NegativeInfinity;
        double top = double.NegativeInfinity;
        for (int i = 0; i < count; i++)
        {
            left = Math.Min(left, xy[2 * i]);
            right = Math.Max(right, xy[2 * i]);
            bottom = Math.Min(bottom, xy[2 * i + 1]);
            top = Math.Max(top, xy[2 * i + 1]);
        }
        double size = Math.Max(right - left, top - bottom);
        double scale = size > 0 ? ((1 << bits) - 1) / size : 0;
        var keys = new ulong[count];
        for (int i = 0; i < count; i++)
        {
            keys[i] = Key((uint)((xy[2 * i] - left) * scale), (uint)((xy[2 * i + 1] - bottom) * scale), bits);
        }
        return keys;
    }

    private static ulong Key(uint x, uint y, int bits)
    {
        ulong key = 0;
        for (int bit = bits - 1; bit >= 0; bit--)
        {
            uint right = (x >> bit) & 1;
            uint up = (y >> bit) & 1;
            key = (key << 2) | ((3 * right) ^ up);
            if (up == 0)
            {
                uint flip = 0u - right;
                uint turned = y ^ flip;
                y = x ^ flip;
                x = turned;
            }
        }
        return key;
    }

    private static uint Hash(uint i)
    {
        i *= 0x9E3779B1;
        i ^= i >> 15;
        i *= 0x85EBCA77;
        return i ^ (i >> 13);
    }

    /// <summary>Radix sort by bytes, least first; bytes in which all keys agree are passed over.</summary>
    private static int[] Sorted(ulong[] keys)
    {
        int count = keys.Length;
        var order = new int[count];
        for (int i = 0; i < count; i++) order[i] = i;
        var nextKeys = new ulong[count];
        var nextOrder = new int[count];
        var starts = new int[256];
        for (int shift = 0; shift < 64; shift += 8)
        {
            Array.Clear(starts);
            foreach (ulong key in keys) starts[(int)(key >> shift) & 255]++;
            if (count == 0 || starts[(int)(keys[0] >> shift) & 255] == count) continue;

            int start = 0;
            for (int b = 0; b < starts.Length; b++)
            {
                int size = starts[b];
                starts[b] = start;
                start += size;
            }
            for (int i = 0; i < count; i++)
            {
                int place = starts[(int)(keys[i] >> shift) & 255]++;
                nextKeys[place] = keys[i];
                nextOrder[place] = order[i];
            }
            (keys, nextKeys) = (nextKeys, keys);
            (order, nextOrder) = (nextOrder, order);
        }
        return order;
    }
}
