package whorl.sheet;

import java.util.OptionalDouble;
import whorl.syntax.Expr;

/**
 * One comparison of a condition with the numbers that were compared.
 *
 * @param text the comparison as written
 * @param left value of the left side
 * @param right value of the right side
 * @param share the share of the limit that is used: the side that must be smaller over the side
 *     that must be larger, where both have the same sign and the limit is not zero
 * @param margin the side that must be larger minus the side that must be smaller
 * @param holds whether it holds
 */
public record Comparison(
    Expr.Comparison text,
    Quantity left,
    Quantity right,
    OptionalDouble share,
    Quantity margin,
    boolean holds) {}
