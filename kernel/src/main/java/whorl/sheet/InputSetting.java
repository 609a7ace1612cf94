package whorl.sheet;

import java.util.Optional;
import whorl.check.InputForm;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.DiagnosticText;
import whorl.diagnostic.Source;
import whorl.diagnostic.Span;
import whorl.syntax.CatalogueWords;
import whorl.syntax.Expr;
import whorl.syntax.Parsed;
import whorl.syntax.Parser;
import whorl.syntax.Statement;

/**
 * Another value for an input, set from outside a note for one run: {@code n = 7000 rpm}. It
 * replaces the right side where the input is defined, so that unit and kind are checked there.
 *
 * @param name the input, folded
 * @param value the new right side, as written
 */
public record InputSetting(String name, String value) {

  /**
   * Reads a setting.
   *
   * @throws IllegalArgumentException if it is no definition of an input, with a message for people
   */
  public static InputSetting read(String text) {
    var source = new Source(text);
    Parsed parsed = Parser.parse(source, name -> false, CatalogueWords.STANDARD);
    if (!parsed.errors().isEmpty()) {
      Diagnostic first = parsed.errors().get(0);
      throw new IllegalArgumentException(DiagnosticText.render(first, source));
    }
    if (parsed.statements().size() == 1
        && parsed.statements().get(0) instanceof Statement.Definition definition
        && definition.bracket() == null
        && InputForm.isInput(definition.value())) {
      return new InputSetting(definition.name().name(), source.slice(definition.value().span()));
    }
    throw new IllegalArgumentException(
        "An input is set as name=value, such as n=7000 rpm, but this is: " + text.strip());
  }

  /** What a text holds of the name that is set. */
  public enum Found {
    /** Nothing. */
    ABSENT,
    /** An input, which takes the value. */
    INPUT,
    /** A derived quantity or a function, which cannot be set. */
    DERIVED
  }

  /**
   * A text with the value set.
   *
   * @param text the text, changed only where an input was found
   */
  public record Applied(Found found, String text) {}

  /** Sets the value in the text of a cell. */
  public Applied applyTo(String text) {
    var source = new Source(text);
    Optional<Statement> statement =
        Parser.parse(source, any -> false, CatalogueWords.STANDARD).statements().stream()
            .filter(candidate -> name.equals(definedBy(candidate)))
            .findFirst();
    if (statement.isEmpty()) {
      return new Applied(Found.ABSENT, text);
    }
    if (statement.get() instanceof Statement.Definition definition
        && InputForm.isInput(definition.value())) {
      Expr old = definition.value();
      String before = source.slice(new Span(0, old.span().start()));
      String behind = source.slice(new Span(old.span().end(), source.length()));
      return new Applied(Found.INPUT, before + value + behind);
    }
    return new Applied(Found.DERIVED, text);
  }

  private static String definedBy(Statement statement) {
    if (statement instanceof Statement.Definition definition) {
      return definition.name().name();
    }
    return statement instanceof Statement.Function function ? function.name().name() : "";
  }
}
