package whorl.report;

import java.util.ArrayList;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.DiagnosticText;
import whorl.diagnostic.Source;

/** A message in HTML: problem, the lines it points at, reason, fix. */
public final class ErrorCard {
  private ErrorCard() {}

  /** Sets a message over the text it points into. */
  static Html html(Diagnostic diagnostic, Source source) {
    var parts = new ArrayList<Html>();
    parts.add(Html.styled("div", Look.PROBLEM, Html.text(diagnostic.problem())));
    parts.add(
        Html.styled("pre", Look.EXCERPT, Html.text(DiagnosticText.excerpt(diagnostic, source))));
    for (String advice : new String[] {diagnostic.reason(), diagnostic.fix()}) {
      if (!advice.isEmpty()) {
        parts.add(Html.styled("div", Look.ADVICE, Html.text(advice)));
      }
    }
    return Html.all(parts);
  }

  /** A message that stands by itself, with a rail beside it. */
  public static String alone(Diagnostic diagnostic, Source source) {
    return Html.styled("div", Look.CARD_ALONE, html(diagnostic, source)).toString();
  }
}
