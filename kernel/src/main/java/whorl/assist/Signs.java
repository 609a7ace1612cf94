package whorl.assist;

import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import whorl.assist.Completion.Candidate;
import whorl.syntax.GreekNames;

/** Signs that no keyboard has, by the names that one types behind a backslash. */
final class Signs {
  private static final Pattern TYPED = Pattern.compile("\\\\([A-Za-z]*|\\^[-+]?[0-9]*)$");

  /** A sign with the name of its spelling. */
  private record Sign(String name, String sign, String words) {}

  private static final List<Sign> ALL =
      Stream.concat(
              new TreeMap<>(GreekNames.letters()).entrySet().stream().map(Signs::letter),
              Stream.of(
                  new Sign("times", "×", "cross product"),
                  new Sign("cdot", "·", "dot product; product of units"),
                  new Sign("pm", "±", "tolerance"),
                  new Sign("le", "≤", "at most"),
                  new Sign("ge", "≥", "at least"),
                  new Sign("deg", "°", "degree"),
                  new Sign("sqrt", "sqrt", "square root"),
                  new Sign("^2", "²", "squared"),
                  new Sign("^3", "³", "cubed"),
                  new Sign("^4", "⁴", "to the power 4"),
                  new Sign("^-1", "⁻¹", "reciprocal"),
                  new Sign("^-2", "⁻²", "reciprocal of the square")))
          .toList();

  private Signs() {}

  private static Sign letter(Map.Entry<String, String> letter) {
    return new Sign(letter.getKey(), letter.getValue(), "Greek " + letter.getKey());
  }

  /** Whether what stands in front of the cursor is a backslash with the beginning of a name. */
  static boolean areTyped(String inFront) {
    return TYPED.matcher(inFront).find();
  }

  /** The signs whose names begin as typed; where one has that very name, only that. */
  static Completion complete(String inFront) {
    Matcher matcher = TYPED.matcher(inFront);
    if (!matcher.find()) {
      return Completion.none(inFront.length());
    }
    String typed = matcher.group(1);
    List<Sign> found = ALL.stream().filter(sign -> sign.name().startsWith(typed)).toList();
    List<Sign> exact = found.stream().filter(sign -> sign.name().equals(typed)).toList();
    return new Completion(
        matcher.start(),
        inFront.length(),
        (exact.isEmpty() ? found : exact)
            .stream().map(sign -> new Candidate(sign.sign(), "symbol", sign.words())).toList());
  }
}
