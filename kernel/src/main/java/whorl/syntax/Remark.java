package whorl.syntax;

import whorl.diagnostic.Span;

/**
 * A remark that stands alone on its line. It belongs to no statement and shows nowhere; the printer
 * keeps it.
 *
 * @param text the remark without its sign
 */
public record Remark(Span span, String text) {}
