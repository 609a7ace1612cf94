package whorl.sheet;

import java.util.Optional;
import whorl.eval.Value;

/**
 * Something in a sketch.
 *
 * @param name what the author wrote for it
 * @param quantity the thing or vector, along the axes of the world
 * @param at the point or axis that a vector is about; empty for a free vector
 */
public record Depicted(String name, Quantity quantity, Optional<Value.Thing> at) {}
