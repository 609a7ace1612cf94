package whorl.units.kind;

/** Functions that take a quantity of one kind only. */
public enum Function {
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
