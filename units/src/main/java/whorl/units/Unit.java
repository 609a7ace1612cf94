package whorl.units;

/** A unit of measurement. */
public interface Unit {}
