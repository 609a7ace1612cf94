package whorl.check;

import whorl.syntax.Expr;

/**
 * A thing in space by what the sheet writes for it. Since a name has one definition, equal texts
 * mean the same thing; a name that only stands for another is that other.
 *
 * @param text canonical
 * @param expr what is to be worked out where the thing itself is needed; it names only what the
 *     quantity that is anchored depends on too
 */
public record Anchor(String text, Expr expr) {
  /** Whether both are the same thing. */
  boolean sameAs(Anchor other) {
    return text.equals(other.text);
  }
}
