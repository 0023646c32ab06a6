using System.Collections.Frozen;
using System.Collections.Immutable;
using SpecLint.Spec.Units;

namespace SpecLint.Review.Rules;

/// <summary>A table of reference data with its source.</summary>
public sealed record ReferenceTable
{
    /// <summary>Its name.</summary>
    public required string Name { get; init; }

    /// <summary>What it lists.</summary>
    public required string What { get; init; }

    /// <summary>Where its numbers come from.</summary>
    public required string Source { get; init; }

    /// <summary>How sure they are: <c>seen</c>, <c>from-memory</c> or <c>common-practice</c>.</summary>
    public required string Status { get; init; }

    /// <summary>The columns in order of first appearance.</summary>
    public required ImmutableArray<ReferenceColumn> Columns { get; init; }

    /// <summary>The rows in order.</summary>
    public required ImmutableArray<ReferenceRow> Rows { get; init; }

    /// <summary>The column of a name, or null.</summary>
    /// <param name="name">Column name.</param>
    public ReferenceColumn? FindColumn(string name) =>
        Columns.FirstOrDefault(c => string.Equals(c.Name, name, StringComparison.Ordinal));

    /// <summary>The first row whose column holds a text, or null.</summary>
    /// <param name="column">Column name.</param>
    /// <param name="text">The text wanted.</param>
    public ReferenceRow? FindRow(string column, string text) =>
        Rows.FirstOrDefault(r => r.Find(column) is { } cell && string.Equals(cell.Text, text, StringComparison.Ordinal));

    /// <summary>The first row that fits, or null.</summary>
    /// <param name="fits">The condition.</param>
    public ReferenceRow? FindRow(Func<ReferenceRow, bool> fits) => Rows.FirstOrDefault(fits);
}

/// <summary>A column of a reference table.</summary>
/// <param name="Name">Its name; items of a list cell are columns of their own, <c>name[0]</c>, <c>name[1]</c>.</param>
/// <param name="IsNumber">True when its cells are numbers.</param>
/// <param name="Dimension">Dimension of its numbers.</param>
public sealed record ReferenceColumn(string Name, bool IsNumber, Dimension Dimension);

/// <summary>A cell of a reference table.</summary>
/// <param name="Text">As written.</param>
/// <param name="Number">In coherent SI; null for a text.</param>
public sealed record ReferenceCell(string Text, double? Number);

/// <summary>A row of a reference table.</summary>
/// <param name="Cells">Cells by column.</param>
public sealed record ReferenceRow(FrozenDictionary<string, ReferenceCell> Cells)
{
    /// <summary>The cell of a column, or null when the row has none.</summary>
    /// <param name="column">Column name.</param>
    public ReferenceCell? Find(string column) => Cells.GetValueOrDefault(column);

    /// <summary>The number of a column in coherent SI, or null when the row has none.</summary>
    /// <param name="column">Column name.</param>
    public double? Number(string column) => Find(column)?.Number;

    /// <summary>The text of a column, or null when the row has none.</summary>
    /// <param name="column">Column name.</param>
    public string? Text(string column) => Find(column)?.Text;
}
