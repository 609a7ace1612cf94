package whorl.assist;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import whorl.check.Meaning;
import whorl.report.InfoCard;
import whorl.report.InfoCard.Fact;
import whorl.report.QuantityText;
import whorl.sheet.Definition;
import whorl.sheet.NameCard;
import whorl.sheet.Sheet;
import whorl.units.UnitText;

/** What there is to say of the names of a sheet. */
final class NameCards {
  /** So many of a list are shown where the usual is asked for. */
  private static final int USUAL_LENGTH = 6;

  private final Sheet sheet;
  private final boolean all;

  /**
   * Cards with the names of one sheet.
   *
   * @param all whether lists are shown in full, each name with its value
   */
  NameCards(Sheet sheet, boolean all) {
    this.sheet = sheet;
    this.all = all;
  }

  /**
   * A name of the sheet.
   *
   * @param draft the cell that the name was met in
   */
  InfoCard of(NameCard card, DraftSheet draft) {
    Definition definition = card.definition();
    var facts = new ArrayList<Fact>();
    var quantity = definition.quantity();
    if (quantity != null) {
      facts.add(new Fact("value", QuantityText.inFull(quantity)));
    }
    facts.addAll(state(definition.state()));
    draft
        .line(definition.name())
        .map(draft::canonical)
        .filter(text -> !text.equals(definition.text()))
        .ifPresent(text -> facts.add(new Fact("not run yet", List.of(text))));
    facts.addAll(parameters(definition));
    facts.add(new Fact("remark", present(definition.remark())));
    facts.add(Fact.of("defined in", definition.label()));
    facts.add(new Fact("uses", names(card.uses(), this::withValue)));
    facts.add(new Fact("used by", names(card.usedBy(), this::withText)));
    facts.add(new Fact("checks", lines(card.checks().stream().map(NameCards::judged).toList())));
    facts.add(new Fact("rests on", lines(card.doubts().stream().map(NameCards::fails).toList())));
    return new InfoCard(definition.text(), lead(definition), facts);
  }

  private static List<String> present(String text) {
    return text.isEmpty() ? List.of() : List.of(text);
  }

  private static String lead(Definition definition) {
    String kind = definition.kind();
    return switch (definition.sort()) {
      case INPUT -> kind.isEmpty() ? "input" : kind + ", input";
      case DERIVED -> kind;
      case FUNCTION -> kind.isEmpty() ? "function" : "function, gives " + kind;
      case PUBLISHED -> kind.isEmpty() ? "function from Java" : "function from Java, gives " + kind;
    };
  }

  private static List<Fact> state(Definition.State state) {
    if (state instanceof Definition.State.Waiting waiting) {
      return List.of(Fact.of("waits for", String.join(", ", waiting.names())));
    } else if (state instanceof Definition.State.Broken broken) {
      var last = broken.last();
      return List.of(
          Fact.of("broken", broken.diagnostic().problem()),
          new Fact("last value", last == null ? List.of() : List.of(QuantityText.value(last))));
    }
    return List.of();
  }

  private List<Fact> parameters(Definition definition) {
    return sheet
        .scope()
        .meaning(definition.name())
        .filter(Meaning.Function.class::isInstance)
        .map(meaning -> ((Meaning.Function) meaning).parameters())
        .map(
            parameters ->
                List.of(new Fact("takes", parameters.stream().map(NameCards::words).toList())))
        .orElse(List.of());
  }

  /** A parameter with its unit and kind. */
  static String words(Meaning.Parameter parameter) {
    UnitText unit = parameter.unit().text();
    return parameter.name()
        + (unit.equals(UnitText.ONE) ? "" : " [" + unit.typeset() + "]")
        + ", "
        + parameter.readings().words();
  }

  private static String judged(NameCard.Judged check) {
    return check.holds().map(holds -> holds ? "holds" : "FAILS").orElse("open")
        + ": "
        + check.text();
  }

  private static String fails(String assumption) {
    return assumption + ", an assumption that fails";
  }

  private List<String> names(List<String> names, Function<String, String> inFull) {
    return all || names.isEmpty()
        ? names.stream().map(inFull).toList()
        : List.of(String.join(", ", cut(names)));
  }

  private List<String> lines(List<String> lines) {
    return all ? lines : cut(lines);
  }

  private static List<String> cut(List<String> names) {
    if (names.size() <= USUAL_LENGTH) {
      return names;
    }
    var cut = new ArrayList<>(names.subList(0, USUAL_LENGTH));
    cut.add("and " + (names.size() - USUAL_LENGTH) + " more");
    return cut;
  }

  private String withValue(String name) {
    return sheet
        .quantity(name)
        .map(quantity -> name + " = " + QuantityText.value(quantity))
        .orElse(name);
  }

  private String withText(String name) {
    return sheet.card(name).map(card -> card.definition().text()).orElse(name);
  }

  /** A name that only the cell defines, as far as its line can be read. */
  static InfoCard ofCell(String name, DraftSheet draft, String remark) {
    var facts = new ArrayList<Fact>();
    Meaning meaning = draft.meaning(name).orElse(null);
    if (meaning instanceof Meaning.Function function) {
      facts.add(new Fact("takes", function.parameters().stream().map(NameCards::words).toList()));
    }
    facts.add(new Fact("remark", present(remark)));
    facts.add(Fact.of("defined in", "this cell; not run yet"));
    String text = draft.line(name).map(draft::canonical).orElse(name);
    return new InfoCard(text, meaning instanceof Meaning.Quantity value ? kind(value) : "", facts);
  }

  private static String kind(Meaning.Quantity value) {
    return value.type() instanceof whorl.check.Type.Real real
        ? real.readings().words()
        : value.type() instanceof whorl.check.Type.Vector vector
            ? vector.readings().words() + ", a vector"
            : value.type() instanceof whorl.check.Type.Thing thing ? thing.sort().words() : "";
  }
}
