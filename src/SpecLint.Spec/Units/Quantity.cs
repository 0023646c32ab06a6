namespace SpecLint.Spec.Units;

/// <summary>A value with its dimension and its stated tolerance.</summary>
/// <param name="Value">Value in coherent SI.</param>
/// <param name="Dimension">Its dimension.</param>
/// <param name="Below">Largest downward deviation, in SI, ≥ 0.</param>
/// <param name="Above">Largest upward deviation, in SI, ≥ 0.</param>
/// <param name="UnitText">The unit as written, in its normal spelling; empty for a bare number.</param>
/// <param name="HasTolerance">True when a tolerance was written.</param>
public readonly record struct Quantity(double Value, Dimension Dimension, double Below, double Above, string UnitText, bool HasTolerance);
