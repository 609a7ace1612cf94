package whorl.report;

import java.util.List;
import org.jspecify.annotations.Nullable;
import whorl.diagnostic.Diagnostic;

/**
 * A row of the step table, apart from the medium.
 *
 * @param tone how it stands
 * @param quantity what the row is about: a symbol, or the word of the statement
 * @param kind the kind of the quantity in words, or empty
 * @param rule the formula
 * @param with what went in, a value a line
 * @param gives the result, and below it the same in the coherent unit where that helps, set in
 *     columns of sign, number and unit; none where lines say it
 * @param further what stands under the result, or in its place
 * @param why remark and reservations
 * @param card what is wrong, set under the row over its whole width; null where nothing is
 * @param grid numbers set under the row over its whole width; null where there are none
 * @param drawing a drawing, set under the row where the medium has any; null where there is none
 */
record Row(
    Tone tone,
    Line quantity,
    String kind,
    List<Line> rule,
    List<Line> with,
    List<Amount> gives,
    List<Line> further,
    List<Line> why,
    @Nullable Diagnostic card,
    @Nullable Grid grid,
    @Nullable Html drawing) {
  /** The heads of the five columns. */
  static final List<String> HEADS = List.of("quantity", "rule", "with", "gives", "why");

  /** A row with nothing under it but what is wrong. */
  Row(
      Tone tone,
      Line quantity,
      String kind,
      List<Line> rule,
      List<Line> with,
      List<Amount> gives,
      List<Line> further,
      List<Line> why,
      @Nullable Diagnostic card) {
    this(tone, quantity, kind, rule, with, gives, further, why, card, null, null);
  }

  /** Copies the lists. */
  Row {
    rule = List.copyOf(rule);
    with = List.copyOf(with);
    gives = List.copyOf(gives);
    further = List.copyOf(further);
    why = List.copyOf(why);
  }
}
