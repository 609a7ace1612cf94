package whorl.sheet;

/** A name that went into a step, with the quantity it stood for, in the unit it was given in. */
public record Given(String name, Quantity quantity) {}
