namespace SpecLint.Review.Figures;

/// <summary>An intermediate result of the figure graph that is no single number, computed once and shared.</summary>
/// <param name="Name">Dotted name, used in the working.</param>
/// <param name="Compute">Computes it; returns null when the evaluation is incomplete.</param>
/// <typeparam name="T">Its type.</typeparam>
public sealed record PartDefinition<T>(string Name, Func<Evaluation, T?> Compute)
    where T : class;
