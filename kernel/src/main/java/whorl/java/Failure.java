package whorl.java;

import java.util.List;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.DiagnosticText;
import whorl.diagnostic.Span;

/** A text in Java does not go on. */
final class Failure extends Exception {
  private static final long serialVersionUID = 1;

  private final String name;
  private final transient JavaText text;
  private final transient List<Diagnostic> errors;

  /**
   * A failure.
   *
   * @param name what the sort of error is called
   * @param text what failed
   * @param errors at least one, which point into the text
   */
  Failure(String name, JavaText text, List<Diagnostic> errors) {
    super(errors.get(0).problem());
    this.name = name;
    this.text = text;
    this.errors = List.copyOf(errors);
  }

  String name() {
    return name;
  }

  List<Diagnostic> errors() {
    return errors;
  }

  /** The failure as one of a text that runs this one, at a place in that. */
  Failure within(JavaText outer, Span place) {
    if (outer == text) {
      return this;
    }
    List<Diagnostic> placed =
        errors.stream()
            .map(
                error ->
                    Diagnostic.of(error.code(), error.problem(), place, "", "In " + details(error)))
            .toList();
    return new Failure(name, outer, placed);
  }

  private String details(Diagnostic error) {
    String rendered = DiagnosticText.render(error, text.source());
    return text.label() + ":" + rendered.substring(error.problem().length());
  }
}
