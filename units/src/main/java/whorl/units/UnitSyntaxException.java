package whorl.units;

import java.util.Optional;
import org.jspecify.annotations.Nullable;

/**
 * A text that cannot be read as a unit, whatever the symbols in it mean. It tells where and why,
 * and where there is one, the way to write what is probably meant.
 */
public final class UnitSyntaxException extends IllegalArgumentException {

  private static final long serialVersionUID = 1;

  /** Why a text is no unit. */
  public enum Reason {
    /** Nothing but blanks. */
    EMPTY("a unit is missing"),
    /** More characters or members than any unit has. */
    TOO_LONG("this is too long for a unit"),
    /** A character that no unit has. */
    CHARACTER("this character has no place in a unit"),
    /** A number that is no exponent. */
    NUMBER("a number has no place in a unit"),
    /** An operator or parenthesis with no member beside it. */
    MEMBER_MISSING("a unit symbol is missing here"),
    /** An exponent that is no whole number, or zero. */
    EXPONENT("the exponent of a unit is a whole number"),
    /** An exponent beyond {@link UnitText#LARGEST_EXPONENT}. */
    EXPONENT_RANGE("the exponent is too large for a unit"),
    /** {@code m/s/s}. */
    SECOND_SLASH("a unit has one slash"),
    /** {@code W/m²·K}, which has two readings. */
    PRODUCT_BEHIND_SLASH("a product behind the slash needs parentheses"),
    /** A parenthesis elsewhere than behind the slash, or without its partner. */
    PARENTHESIS("parentheses stand only round what is behind the slash"),
    /** {@code ft-lbf}. */
    HYPHEN("a hyphen does not multiply units"),
    /** A UCUM annotation, which UCUM takes for the number one. */
    ANNOTATION("an annotation in braces counts as the number one, so that it says nothing here"),
    /** A UCUM code that has no counterpart in the catalogue. */
    UNKNOWN_CODE("this code has no counterpart in the catalogue");

    private final String sentence;

    Reason(String sentence) {
      this.sentence = sentence;
    }

    /** The reason in words, without capital and full stop. */
    public String sentence() {
      return sentence;
    }
  }

  private final Reason reason;
  private final int offset;
  private final int length;
  private final @Nullable String suggestion;

  UnitSyntaxException(
      Reason reason, String text, int offset, int length, @Nullable String suggestion) {
    super(
        "\"%s\" is no unit: %s%s"
            .formatted(text, reason.sentence, suggestion == null ? "" : "; write " + suggestion));
    this.reason = reason;
    this.offset = offset;
    this.length = length;
    this.suggestion = suggestion;
  }

  static UnitSyntaxException tooLong(String text) {
    int length = text.codePointCount(0, text.length());
    return new UnitSyntaxException(Reason.TOO_LONG, text, 0, length, null);
  }

  /** Why the text is refused. */
  public Reason reason() {
    return reason;
  }

  /** Where the fault begins, in code points from the start of the text. */
  public int offset() {
    return offset;
  }

  /** How far the fault reaches, in code points; zero at the end of the text. */
  public int length() {
    return length;
  }

  /** The way to write what is probably meant. */
  public Optional<String> suggestion() {
    return Optional.ofNullable(suggestion);
  }
}
