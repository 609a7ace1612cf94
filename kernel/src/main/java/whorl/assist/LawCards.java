package whorl.assist;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import whorl.laws.Example;
import whorl.laws.Law;
import whorl.laws.Laws;
import whorl.laws.Need;
import whorl.laws.Parameter;
import whorl.laws.Validity;
import whorl.report.InfoCard;
import whorl.report.InfoCard.Fact;

/** What there is to say of laws and their parameters. */
final class LawCards {
  private LawCards() {}

  /** All laws of a name on one card; empty where it is the name of none. */
  static Optional<InfoCard> named(String name) {
    List<Law> laws = Laws.named(name);
    if (laws.isEmpty()) {
      return Optional.empty();
    }
    var facts = new ArrayList<Fact>();
    boolean several = laws.size() > 1;
    for (Law law : laws) {
      if (several) {
        facts.add(Fact.of("law", law.head()));
        facts.add(Fact.of("", law.title()));
      }
      facts.addAll(facts(law));
    }
    String title = several ? name + "(…)" : laws.get(0).head();
    String lead = laws.stream().map(Law::title).collect(Collectors.joining("; "));
    return Optional.of(new InfoCard(title, lead, facts));
  }

  private static List<Fact> facts(Law law) {
    Example example = law.example();
    var lines = new ArrayList<>(example.lines());
    lines.add(example.expression() + " = " + example.value());
    return List.of(
        Fact.of("formula", law.formula()),
        new Fact("takes", law.parameters().stream().map(LawCards::words).toList()),
        Fact.of("gives", law.result().sort().withArticle()),
        new Fact("valid for", law.validity().stream().map(Validity::text).toList()),
        Fact.of("source", law.source()),
        new Fact("example", lines));
  }

  /** A parameter with what it takes. */
  static String words(Parameter parameter) {
    return parameter.word()
        + (parameter.symbol().isEmpty() || parameter.symbol().equals(parameter.word())
            ? ""
            : " (" + parameter.symbol() + ")")
        + ", "
        + parameter.sort().withArticle()
        + ": "
        + parameter.explanation()
        + need(parameter.need());
  }

  private static String need(Need need) {
    if (need instanceof Need.Optional optional) {
      return optional.otherwise().isEmpty()
          ? "; may be left out"
          : "; left out: " + optional.otherwise();
    } else if (need instanceof Need.OneOf) {
      return "; one of several";
    }
    return need instanceof Need.Known known ? "; left out: as known of " + known.of() : "";
  }

  /** The parameter of a word in a law of a name. */
  static Optional<InfoCard> parameter(String law, String word) {
    return Laws.named(law).stream()
        .flatMap(each -> each.parameters().stream())
        .filter(parameter -> parameter.word().equals(word))
        .findFirst()
        .map(parameter -> new InfoCard(words(parameter), "parameter of " + law, List.of()));
  }
}
