package whorl.sheet;

import java.util.List;
import java.util.function.Function;
import java.util.function.Predicate;
import java.util.stream.Collectors;
import whorl.check.InputForm;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Span;
import whorl.syntax.Printer;
import whorl.syntax.Statement;
import whorl.syntax.UnitWord;
import whorl.units.UnitText;

/** The messages about names, cells and hand-worked values: the one place for their wording. */
final class SheetMessages {
  private static final String ONE_DEFINITION =
      "A name has one definition, so that the order of cells never changes a result.";

  private static final String AS_IT_WAS = "The sheet is as it was.";

  /** The start of the text, for what has no place in it. */
  private static final Span NOWHERE = new Span(0, 0);

  private SheetMessages() {}

  static Diagnostic definedAbove(String name, Span span, Node first) {
    return Diagnostic.of(
            "defined",
            name
                + " already has its definition: line "
                + first.place().line()
                + ", "
                + said(first)
                + ".",
            span,
            ONE_DEFINITION,
            "Change that line, or take another name here, such as " + another(name) + ".")
        .with(nameSpan(first.statement()), "first defined here");
  }

  static Diagnostic definedElsewhere(String name, Span span, Node first, String label) {
    return Diagnostic.of(
        "defined",
        name + " already has its definition: " + label + ", " + said(first) + ".",
        span,
        ONE_DEFINITION,
        "Change it there, or take another name here, such as " + another(name) + ".");
  }

  /** What is typed in a console takes over a name. */
  static Diagnostic takesOver(Node node, Node other, String label) {
    String name = node.defines().orElseThrow();
    return Diagnostic.of(
        "takes-over",
        name + " replaces its definition in " + label + ", " + said(other) + ".",
        nameSpan(node.statement()),
        "",
        "");
  }

  static Diagnostic withdrawn(String name, Node node, String label) {
    return Diagnostic.of(
        "withdrawn",
        name + " is withdrawn from " + label + "; it was " + said(node) + ".",
        new Span(0, name.length()),
        "",
        "");
  }

  static Diagnostic notDefined(String name, Span span, List<String> near) {
    return Diagnostic.of(
        "undefined",
        "No cell defines " + name + ".",
        span,
        "",
        near.isEmpty() ? "" : "Names spelled alike: " + String.join(", ", near) + ".");
  }

  /** The run of a cell was interrupted before anything was worked out. */
  static Diagnostic interrupted() {
    return Diagnostic.of("interrupted", "The cell was interrupted.", NOWHERE, "", AS_IT_WAS);
  }

  /** The run was interrupted at a statement of the cell. */
  static Diagnostic interrupted(Node at) {
    return Diagnostic.of(
        "interrupted",
        "Interrupted while " + called(at) + " was worked out.",
        at.statement().span(),
        "",
        AS_IT_WAS);
  }

  /** The run was interrupted at a statement of another cell, which depends on this one. */
  static Diagnostic interrupted(Node at, String label) {
    return Diagnostic.of(
        "interrupted",
        "Interrupted while " + called(at) + " in " + label + " was worked out anew.",
        NOWHERE,
        "",
        AS_IT_WAS);
  }

  private static String called(Node node) {
    return node.defines().orElse("`" + shortened(node.text()) + "`");
  }

  private static String shortened(String text) {
    return text.length() <= 40 ? text : text.substring(0, 38) + " …";
  }

  private static String another(String name) {
    return name.contains("_") ? name + "2" : name + "_2";
  }

  private static String said(Node node) {
    if (node.statement() instanceof Statement.Definition definition) {
      String value = Printer.expression(definition.value());
      String unit =
          definition.bracket() == null || definition.bracket().unit().equals(UnitText.ONE)
              ? ""
              : definition.bracket().unit().typeset();
      if (!unit.isEmpty()) {
        unit = " " + (InputForm.isBare(definition.value()) ? unit : "[" + unit + "]");
      }
      return shortened(value) + unit;
    }
    return node.statement() instanceof Statement.Published ? "a function from Java" : "a function";
  }

  static Diagnostic readAsUnit(String name, Span span, UnitWord word, CellContent other) {
    int line = other.source().line(word.span().start());
    return Diagnostic.of(
        "unit-or-name",
        name
            + " cannot be defined here: "
            + other.label()
            + ", line "
            + line
            + ", has read it as a unit.",
        span,
        "That line says: " + other.source().lineText(line).strip(),
        "There, write · in front of "
            + name
            + " for the unit or put blanks around the sign for"
            + " the name; or take another name here.");
  }

  /** A ring of definitions, reported at one of the cell that closes it. */
  static Diagnostic cycle(
      List<Node> ring, Predicate<Node> inThisCell, Function<CellId, String> label) {
    int start = 0;
    while (!inThisCell.test(ring.get(start))) {
      start++;
    }
    Node here = ring.get(start);
    String first = here.defines().orElseThrow();
    var path = new StringBuilder(first);
    for (int i = 1; i < ring.size(); i++) {
      path.append(" → ").append(ring.get((start + i) % ring.size()).defines().orElseThrow());
    }
    path.append(" → ").append(first);
    String elsewhere =
        ring.stream()
            .filter(inThisCell.negate())
            .map(
                node ->
                    node.defines().orElseThrow()
                        + " is defined in "
                        + label.apply(node.place().cell()))
            .sorted()
            .collect(Collectors.joining("; "));
    return Diagnostic.of(
        "cycle",
        ring.size() == 1
            ? first + " is defined by itself."
            : first + " depends on itself: " + path + ".",
        nameSpan(here.statement()),
        elsewhere.isEmpty() ? "" : elsewhere + ".",
        "Work one of them out without the others. A value that must satisfy an equation is what"
            + " `solve` finds; this version reads `solve` but does not work it out.");
  }

  static Diagnostic hides(Statement statement, String name) {
    return Diagnostic.of(
        "hides",
        name
            + " now means this definition; the function "
            + name
            + " is hidden in the whole sheet.",
        nameSpan(statement),
        "",
        "Take another name if the function is wanted.");
  }

  static Diagnostic undefined(Span span, List<String> names, List<String> alike) {
    return Diagnostic.of(
        "undefined",
        "This statement waits for " + String.join(" and ", names) + ", which no cell defines.",
        span,
        "",
        alike.isEmpty() ? "" : "Names spelled alike: " + String.join(", ", alike) + ".");
  }

  static Diagnostic statedZero(Statement.Reproduction reproduction) {
    return Diagnostic.of(
        "stated-zero",
        "The stated value is 0, so that no deviation from it can be worked out.",
        reproduction.stated().span(),
        "The deviation is (computed − stated)/stated.",
        "Check the size instead: check |x| <= a small value.");
  }

  static Diagnostic negativeDeviation(Statement.Reproduction reproduction) {
    return Diagnostic.of(
        "negative-within",
        "The deviation allowed is less than zero.",
        reproduction.within().span(),
        "",
        "Write how far the two values may lie apart, such as within 0.5 %.");
  }

  static Span nameSpan(Statement statement) {
    if (statement instanceof Statement.Definition definition) {
      return definition.name().span();
    }
    if (statement instanceof Statement.Published published) {
      return published.name().span();
    }
    return statement instanceof Statement.Motion motion
        ? motion.name().span()
        : ((Statement.Function) statement).name().span();
  }
}
