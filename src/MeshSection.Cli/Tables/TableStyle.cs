using System.Globalization;
using Spectre.Console;

namespace MeshSection.Cli.Tables;

/// <summary>How tables look.</summary>
internal static class TableStyle
{
    /// <summary>A table without rows.</summary>
    /// <param name="title">What the first column is headed with: the subject of the table.</param>
    /// <param name="columns">The other columns.</param>
    public static Table Columns(string title, params ReadOnlySpan<string> columns)
    {
        var table = new Table { Border = TableBorder.Simple, UseSafeBorder = true };
        table.AddColumn(new TableColumn(new Text(title)));
        foreach (var column in columns)
        {
            table.AddColumn(new TableColumn(new Text(column)));
        }

        return table;
    }

    /// <summary>Keeps the cells of some columns in one piece, however narrow the terminal: a broken number misleads.</summary>
    /// <param name="table">The table.</param>
    /// <param name="columns">Indices of the columns.</param>
    public static Table KeepWhole(this Table table, params ReadOnlySpan<int> columns)
    {
        foreach (var column in columns)
        {
            table.Columns[column].NoWrap = true;
        }

        return table;
    }

    /// <summary>A whole number.</summary>
    public static string Number(int value) => value.ToString(CultureInfo.InvariantCulture);
}
