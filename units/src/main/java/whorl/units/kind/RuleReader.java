package whorl.units.kind;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import whorl.units.Dimension;

/** Reads the rules; {@code rules.txt} says what a line may hold. */
final class RuleReader {
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
    String[] words = line.split(" ", -1);
    if (words.length < 4) {
      throw notRead(line);
    } else if (words[3].equals("->")) {
      readRule(words, line);
    } else if (words[1].equals("is")) {
      int turn = Integer.parseInt(words[3]);
      standsFor.put(powers.kind(words[0]), new Reading(powers.kind(words[2]), turn, true));
    } else if (words[2].equals("reads")) {
      boolean written = words.length > 5 && words[5].equals("written");
      int turn = Integer.parseInt(words[1]);
      turns.add(new Rules.Turn(powers.kind(words[0]), turn, powers.kind(words[4]), written));
    } else if (words[0].equals("series")) {
      inSeries.put(powers.kind(words[1]), powers.kind(words[3]));
    } else {
      throw notRead(line);
    }
  }

  private static IllegalStateException notRead(String line) {
    return new IllegalStateException("not a rule: " + line);
  }

  /** {@code first operator second -> result, result …}. */
  private void readRule(String[] words, String line) {
    String operator = words[1];
    List<Rules.Rule> rules = rules(operator, line);
    Kind first = kind(words[0]);
    Kind second = operator.equals("^") ? first : kind(words[2]);
    Dimension dimension =
        operator.equals("/")
            ? first.dimension().dividedBy(second.dimension())
            : first.dimension().times(second.dimension());
    Result.Solid solid =
        isSolid(words[0])
            ? Result.Solid.FIRST
            : isSolid(words[2]) ? Result.Solid.SECOND : Result.Solid.NONE;
    List<Rules.Solvable> results = new ArrayList<>();
    for (int i = 4; i < words.length && !words[i].equals(NOTHING); i++) {
      Rules.Solvable result = result(words[i].replace(",", ""), solid);
      if (!result.result().kind().dimension().equals(dimension)) {
        throw new IllegalStateException("wrong in its dimensions: " + line);
      }
      results.add(result);
    }
    rules.add(new Rules.Rule(first, second, results));
  }

  private List<Rules.Rule> rules(String operator, String line) {
    return switch (operator) {
      case "*" -> products;
      case "/" -> quotients;
      case "^" -> squares;
      default -> throw notRead(line);
    };
  }

  private Kind kind(String operand) {
    return powers.kind(isSolid(operand) ? operand.substring(1, operand.length() - 1) : operand);
  }

  private static boolean isSolid(String operand) {
    return operand.startsWith("(") && operand.endsWith(")");
  }

  /**
   * A kind, then {@code @} and turns, a mark for the taint, and {@code ?}, each only if it is
   * there.
   */
  private Rules.Solvable result(String text, Result.Solid solid) {
    boolean oneWay = text.endsWith("?");
    String rest = oneWay ? text.substring(0, text.length() - 1) : text;
    Result.Taint taint = taint(rest.charAt(rest.length() - 1));
    if (taint != Result.Taint.PASSES) {
      rest = rest.substring(0, rest.length() - 1);
    }
    int at = rest.indexOf('@');
    int more = at < 0 ? 0 : Integer.parseInt(rest.substring(at + 1));
    Kind kind = powers.kind(at < 0 ? rest : rest.substring(0, at));
    return new Rules.Solvable(new Result(kind, more, taint, solid), oneWay);
  }

  private static Result.Taint taint(char mark) {
    return switch (mark) {
      case '#' -> Result.Taint.BEGINS;
      case '~' -> Result.Taint.ENDS;
      case '!' -> Result.Taint.FORGOTTEN;
      default -> Result.Taint.PASSES;
    };
  }
}
