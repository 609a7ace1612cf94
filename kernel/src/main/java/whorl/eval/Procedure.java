package whorl.eval;

/**
 * The body of a function, made ready to run.
 *
 * @param code what it works out
 * @param operations number of operations in it, not counting those of functions it calls
 * @param levels how deep its own operations nest
 */
record Procedure(Code code, int operations, int levels) {}
