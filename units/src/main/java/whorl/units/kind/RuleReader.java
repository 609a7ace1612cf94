package whorl.units.kind;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import whorl.units.Dimension;

/** Reads the rules; {@code rules.txt} says what a line may hold. */
final class RuleReader {
  private static final Pattern RULE = Pattern.compile("(\\S+) ([*/^]) (\\S+) -> (.+)");
  private static final Pattern RESULT =
      Pattern.compile("([a-z_^0-9-]+)(?:@(-?\\d))?([#~!]?)(\\??)");
  private static final Pattern SOLID = Pattern.compile("\\((.+)\\)");
  private static final Pattern TURN =
      Pattern.compile("(\\S+) ([+-]\\d) reads as (\\S+)( written)?");
  private static final Pattern STANDS_FOR = Pattern.compile("(\\S+) is (\\S+) ([+-]\\d)");
  private static final Pattern SERIES = Pattern.compile("series (\\S+) = (\\S+)");

  private static final String NOTHING = "nothing";

  private final FormalPowers powers;
  private final List<Rules.Rule> products = new ArrayList<>();
  private final List<Rules.Rule> quotients = new ArrayList<>();
  private final List<Rules.Rule> squares = new ArrayList<>();
  private final List<Rules.Turn> turns = new ArrayList<>();
  private final Map<Kind, Reading> standsFor = new HashMap<>();
  private final Map<Kind, Kind> inSeries = new HashMap<>();

  RuleReader(FormalPowers powers) {
    this.powers = powers;
  }

  Rules read(List<String> lines) {
    lines.forEach(this::readLine);
    return new Rules(products, quotients, squares, turns, standsFor, inSeries);
  }

  private void readLine(String line) {
    Matcher rule = RULE.matcher(line);
    Matcher turn = TURN.matcher(line);
    Matcher stands = STANDS_FOR.matcher(line);
    Matcher series = SERIES.matcher(line);
    if (rule.matches()) {
      readRule(rule);
    } else if (turn.matches()) {
      turns.add(
          new Rules.Turn(
              powers.kind(turn.group(1)),
              Integer.parseInt(turn.group(2)),
              powers.kind(turn.group(3)),
              turn.group(4) != null));
    } else if (stands.matches()) {
      standsFor.put(
          powers.kind(stands.group(1)),
          new Reading(powers.kind(stands.group(2)), Integer.parseInt(stands.group(3)), true));
    } else if (series.matches()) {
      inSeries.put(powers.kind(series.group(1)), powers.kind(series.group(2)));
    } else {
      throw new IllegalStateException("not a rule: " + line);
    }
  }

  private void readRule(Matcher rule) {
    String operator = rule.group(2);
    Kind first = kind(rule.group(1));
    Kind second = operator.equals("^") ? first : kind(rule.group(3));
    Dimension dimension =
        operator.equals("/")
            ? first.dimension().dividedBy(second.dimension())
            : first.dimension().times(second.dimension());
    Result.Solid solid =
        isSolid(rule.group(1))
            ? Result.Solid.FIRST
            : isSolid(rule.group(3)) ? Result.Solid.SECOND : Result.Solid.NONE;
    List<Rules.Solvable> results = new ArrayList<>();
    if (!rule.group(4).equals(NOTHING)) {
      for (String text : rule.group(4).split(", *", -1)) {
        results.add(result(text, solid, dimension));
      }
    }
    rules(operator).add(new Rules.Rule(first, second, results));
  }

  private List<Rules.Rule> rules(String operator) {
    return switch (operator) {
      case "*" -> products;
      case "/" -> quotients;
      default -> squares;
    };
  }

  private Kind kind(String operand) {
    Matcher solid = SOLID.matcher(operand);
    return powers.kind(solid.matches() ? solid.group(1) : operand);
  }

  private static boolean isSolid(String operand) {
    return SOLID.matcher(operand).matches();
  }

  private Rules.Solvable result(String text, Result.Solid solid, Dimension dimension) {
    Matcher result = RESULT.matcher(text);
    if (!result.matches()) {
      throw new IllegalStateException("not a result of a rule: " + text);
    }
    Kind kind = powers.kind(result.group(1));
    if (!kind.dimension().equals(dimension)) {
      throw new IllegalStateException("wrong in its dimensions: a rule with the result " + text);
    }
    int turns = result.group(2) == null ? 0 : Integer.parseInt(result.group(2));
    return new Rules.Solvable(
        new Result(kind, turns, taint(result.group(3)), solid), !result.group(4).isEmpty());
  }

  private static Result.Taint taint(String mark) {
    return switch (mark) {
      case "#" -> Result.Taint.BEGINS;
      case "~" -> Result.Taint.ENDS;
      case "!" -> Result.Taint.FORGOTTEN;
      default -> Result.Taint.PASSES;
    };
  }
}
