package whorl.units.kind;

/** Functions that take quantities of one kind only. */
public enum FunctionFamily {
  /** Sine, cosine and tangent. */
  SINE,
  /** Arc sine, arc cosine and arc tangent. */
  ARC,
  /** Exponential function and its hyperbolic kin. */
  EXPONENTIAL,
  /** Logarithms. */
  LOGARITHM,
  /** The base or the exponent of a power whose exponent is worked out. */
  VARIABLE_POWER
}
