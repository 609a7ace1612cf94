package whorl.assist;

import java.util.List;
import java.util.Optional;
import whorl.report.InfoCard;
import whorl.report.InfoCard.Fact;

/**
 * A word of the language that this version works out.
 *
 * @param word the word
 * @param place where it may stand
 * @param gist what it does, in a few words
 * @param paragraph the same for someone who has not met it
 * @param example a statement with it that stands by itself
 */
record Keyword(String word, At place, String gist, String paragraph, String example) {
  /** Where a word may stand. */
  enum At {
    /** At the start of a line. */
    LINE,
    /** Behind {@code check}. */
    CHECK,
    /** In the place of a value. */
    VALUE,
    /** Behind a condition. */
    CONDITION,
    /** Behind the condition of an {@code if}. */
    IF,
    /** Behind a {@code then} and its value. */
    THEN,
    /** Behind a check that two values are equal. */
    STATED
  }

  private static final List<Keyword> ALL =
      List.of(
          new Keyword(
              "check",
              At.LINE,
              "says whether a condition holds",
              "Says whether a condition holds and how much of the limit is used. With an equals sign"
                  + " and within it compares a value with one that was worked out elsewhere. A check that"
                  + " fails stops nothing, but a run from the command line ends in failure.",
              "check 12 kN * 0.4 m <= 5 kN·m"),
          new Keyword(
              "assume",
              At.LINE,
              "states what the note rests on",
              "States a condition that the note rests on. While it does not hold, every result that"
                  + " uses one of its names is marked.",
              "assume 180 MPa < 235 MPa"),
          new Keyword(
              "motion",
              At.LINE,
              "follows equations of motion over time",
              "Follows equations of motion over time. In the indented lines below it, states start"
                  + " somewhere and have rates, written with a prime; stop when and within say when"
                  + " it ends. Behind it, run_up.ω is the course of a state, and peak(run_up.ω) its"
                  + " largest value.",
              "motion run_up\n    ω [rpm] starts 0\n    ω' = 1 rad/s^2\n    within 10 s"),
          new Keyword(
              "sketch",
              At.LINE,
              "draws things in space",
              "Draws bodies, points, axes, frames, forces and vectors by their names, what is hidden dashed."
                  + " A vector that turns has two heads and an arc that shows which way.",
              "sketch axis(through = point(0, 0, 0), along = (0, 0, 1))"),
          new Keyword(
              "nominal",
              At.CHECK,
              "checks values without their tolerances",
              "Behind check: takes the values without their tolerances.",
              "check nominal 3 mm <= 4 mm"),
          new Keyword(
              "within",
              At.STATED,
              "the deviation allowed",
              "Behind a check with an equals sign: how far the value may be from the one stated, as a share of it or"
                  + " as a quantity of its kind.",
              "check 2 kN * 3 m = 6.02 kN·m within 1 %"),
          new Keyword(
              "if",
              At.VALUE,
              "chooses between two values",
              "Chooses between two values of the same kind: if a condition holds the one behind"
                  + " then, else the other. Inside a formula it needs parentheses.",
              "x = if 2 m < 3 m then 40 kg else 60 kg"),
          new Keyword(
              "then",
              At.IF,
              "the value if the condition holds",
              "Stands behind the condition of an if, in front of the value that is taken if it"
                  + " holds.",
              "x = if 2 m < 3 m then 40 kg else 60 kg"),
          new Keyword(
              "else",
              At.THEN,
              "the value if it does not hold",
              "Stands behind the first value of an if, in front of the one that is taken if the"
                  + " condition does not hold. Another if may follow.",
              "x = if 5 m < 3 m then 40 kg else if 5 m < 9 m then 60 kg else 80 kg"),
          new Keyword(
              "and",
              At.CONDITION,
              "both conditions must hold",
              "Joins two conditions, both of which must hold. It binds tighter than or.",
              "check 2 m < 3 m and 4 kg < 5 kg"),
          new Keyword(
              "or",
              At.CONDITION,
              "one of the conditions must hold",
              "Joins two conditions, one of which must hold.",
              "check 3 m < 2 m or 4 kg < 5 kg"),
          new Keyword(
              "true",
              At.VALUE,
              "a condition that holds",
              "A condition that always holds.",
              "check 2 < 3 and true"),
          new Keyword(
              "false",
              At.VALUE,
              "a condition that does not hold",
              "A condition that never holds.",
              "check 2 < 3 or false"));

  /** All words. */
  static List<Keyword> all() {
    return ALL;
  }

  /** All of it on a card. */
  InfoCard card() {
    return new InfoCard(word, paragraph, List.of(new Fact("example", example.lines().toList())));
  }

  /** The keyword of a spelling, if it is one. */
  static Optional<Keyword> named(String word) {
    return ALL.stream().filter(keyword -> keyword.word.equals(word)).findFirst();
  }
}
