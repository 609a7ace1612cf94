package whorl.units.kind;

import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import whorl.units.Rational;

/** What is said where a factor 2π is missing, or is there too often. */
final class TurnWording {
  private static final Kind FREQUENCY = Kind.named("frequency");
  private static final Kind ANGULAR_VELOCITY = Kind.named("angular_velocity");
  private static final Kind TIME = Kind.named("time");

  private static final String CYCLES_AND_RADIANS =
      "Hz counts cycles, rad/s counts radians; one cycle is 2π rad: ";

  private final Context context;
  private final Optional<String> cycles;
  private final Optional<String> radians;

  TurnWording(Context context) {
    this.context = context;
    this.cycles = context.insideOf(FREQUENCY);
    this.radians = context.insideOf(ANGULAR_VELOCITY);
  }

  /**
   * What is wrong with the turns of a quantity, if that is its mistake.
   *
   * @param declaration what it was to be and what it is, in a sentence
   */
  Optional<Explanation> slip(Readings found, List<Kind> wanted, String declaration) {
    Kind kind = wanted.get(0);
    return TurnSlip.between(found, kind)
        .map(slip -> explained(slip.shortfall(), found, kind))
        .map(e -> kind.dimension().isOne() && !isMixed() ? e.about(declaration) : e)
        .map(explanation -> withNarrowerKind(explanation, wanted));
  }

  private Explanation explained(int shortfall, Readings found, Kind wanted) {
    if (wanted == FREQUENCY && found.kinds().contains(ANGULAR_VELOCITY)) {
      return radiansForCycles();
    }
    boolean fromCycles = wanted == ANGULAR_VELOCITY && found.kinds().contains(FREQUENCY);
    boolean cyclesOnly = cycles.isPresent() && radians.isEmpty();
    boolean writtenTooMuch = shortfall < 0 && leavingOut(shortfall).isPresent();
    if (fromCycles || (cyclesOnly && !writtenTooMuch)) {
      return cyclesForRadians(shortfall, cycles.orElse(context.part(0, "f")));
    }
    if (isMixed()) {
      return between(cycles.orElseThrow(), radians.orElseThrow());
    }
    return shortfall < 0 ? tooMany(wanted, -shortfall) : missing(wanted, shortfall);
  }

  /** Whether both cycles and radians are counted. */
  private boolean isMixed() {
    return cycles.isPresent() && radians.isPresent();
  }

  private static Explanation between(String cycles, String radians) {
    return new Explanation(
        "A factor 2π is missing between `" + cycles + "` and `" + radians + "`.",
        "`" + cycles + "` counts cycles, `" + radians + "` radians.",
        "Write 2*pi*" + cycles + " for " + cycles);
  }

  /** Where cycles are added to or compared with radians. */
  Explanation cyclesForRadians(int shortfall, String text) {
    String problem = "A frequency stands where an angular velocity is needed.";
    Optional<RoundedPi> rounded = roundedPi();
    if (rounded.isPresent()) {
      return new Explanation(
          problem,
          "`"
              + rounded.get().numeral()
              + "` is a plain number here; only pi tells that cycles become radians.",
          "Write " + rounded.get().exact() + " in its place: 2*pi*" + FactorText.factor(text));
    }
    String place = text.equals(context.part(0, text)) ? "" : " for " + text;
    return new Explanation(
        problem,
        "",
        CYCLES_AND_RADIANS
            + leavingOut(shortfall).orElse("write 2*pi*" + FactorText.factor(text) + place));
  }

  private Explanation radiansForCycles() {
    String text = context.part(0, radians.orElse("ω"));
    return new Explanation(
        "An angular velocity stands where a frequency is needed.",
        "",
        CYCLES_AND_RADIANS
            + leavingOut(-1).orElse("write " + FactorText.dividend(text) + "/(2*pi)"));
  }

  /** Angles that are needed where a number of turns stands, of which the cycles are known. */
  Optional<Explanation> angleOfCycles(String problem) {
    return cycles.map(
        name ->
            new Explanation(
                problem, "", CYCLES_AND_RADIANS + "write 2*pi*" + name + " for " + name));
  }

  private Explanation missing(Kind wanted, int turns) {
    String problem =
        "A factor " + power(turns) + " is missing to make this " + wanted.withArticle() + ".";
    Optional<String> leavingOut = leavingOut(turns);
    if (leavingOut.isPresent()) {
      return new Explanation(
          problem,
          radians.map(TurnWording::countsRadians).orElse(""),
          Wording.capital(leavingOut.get()));
    }
    if (wanted == TIME) {
      return new Explanation(
          problem,
          "A number over an angular velocity is a time per radian; one turn is 2π rad.",
          "Multiply by 2*pi for the time of one turn; count revolutions as an angle, as 1e6 rev.");
    }
    return new Explanation(
        problem,
        "It counts radians; one turn is 2π rad.",
        "Multiply by " + written(turns) + ": " + written(turns) + " * " + text());
  }

  private Explanation tooMany(Kind wanted, int turns) {
    Optional<String> leavingOut = leavingOut(-turns);
    return new Explanation(
        "To be " + wanted.withArticle() + ", this has a factor " + power(turns) + " too many.",
        radians
            .map(TurnWording::countsRadians)
            .orElse("An angle counts radians; one turn is 2π rad."),
        leavingOut
            .map(Wording::capital)
            .orElseGet(
                () ->
                    "Divide by "
                        + written(turns)
                        + ": "
                        + FactorText.dividend(context.part(0, wanted.symbol()))
                        + "/"
                        + (turns == 1 ? "(2*pi)" : written(turns))));
  }

  private String text() {
    return FactorText.factor(context.part(0, "it"));
  }

  private static String countsRadians(String name) {
    return "`"
        + name
        + "` is an angular velocity: whether in rpm or rad/s, it counts radians, and the sheet"
        + " converts.";
  }

  /** How the author's own π is mended, if a turn is missing or too many because of it. */
  private Optional<String> leavingOut(int shortfall) {
    List<WrittenPi> pi = context.numbers().pi();
    int power = pi.stream().mapToInt(WrittenPi::power).sum();
    List<WrittenPi> guilty =
        power == -shortfall
            ? pi
            : pi.stream().filter(written -> written.power() == -shortfall).toList();
    return guilty.isEmpty()
        ? Optional.empty()
        : Optional.of(
            guilty.stream()
                .map(TurnWording::leavingOut)
                .distinct()
                .collect(Collectors.joining("; ")));
  }

  private static String leavingOut(WrittenPi written) {
    return written.rest().equals(Rational.ONE)
        ? "leave out `" + written.text() + "`."
        : "write " + written.rest() + " in place of `" + written.text() + "`.";
  }

  /** A numeral for what should be written with pi. */
  private record RoundedPi(String numeral, String exact) {}

  private Optional<RoundedPi> roundedPi() {
    for (String numeral : context.numbers().numerals()) {
      if (isRounded(2 * Math.PI, numeral)) {
        return Optional.of(new RoundedPi(numeral, "2*pi"));
      } else if (isRounded(Math.PI, numeral)) {
        return Optional.of(new RoundedPi(numeral, "pi"));
      }
    }
    return Optional.empty();
  }

  private static boolean isRounded(double exact, String numeral) {
    int decimals = numeral.length() - 1 - numeral.indexOf('.');
    return numeral.contains(".")
        && !numeral.contains("e")
        && decimals > 1
        && Math.abs(Rational.parse(numeral).doubleValue() - exact) < Math.pow(10, -decimals);
  }

  /** A narrower kind would bring its own rule for turns. */
  private Explanation withNarrowerKind(Explanation explanation, List<Kind> wanted) {
    return CloserKind.narrower(context.factors(), wanted)
        .map(
            closer ->
                new Explanation(
                    explanation.problem(),
                    explanation.reason(),
                    "Name the kind of `"
                        + closer.factor()
                        + "` if it is "
                        + closer.kind().withArticle()
                        + ", such as "
                        + closer.bracket()
                        + ": then this is "
                        + wanted.get(0).withArticle()
                        + ". Else "
                        + Wording.lower(explanation.fix())))
        .orElse(explanation);
  }

  private static String power(int turns) {
    return turns == 1 ? "2π" : "(2π)^" + turns;
  }

  private static String written(int turns) {
    return turns == 1 ? "2*pi" : "(2*pi)^" + turns;
  }
}
