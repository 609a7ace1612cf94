package whorl.syntax;

import static java.util.stream.Collectors.joining;
import static java.util.stream.Collectors.toMap;

import java.util.HashMap;
import java.util.Map;

/**
 * Greek letters by their names. A part of a name, between underscores, that is a Greek letter's
 * name with digits behind it or none is the letter: {@code omega_max} is {@code ω_max}, {@code
 * omega1} is {@code ω1}, {@code DeltaT} stays. Capitals that look Latin have no spelled form, since
 * the letter itself could not be told from the Latin one; nor has omicron.
 */
public final class GreekNames {
  private static final Map<String, String> LETTERS = new HashMap<>();

  static {
    String[] names = {
      "alpha", "beta", "gamma", "delta", "epsilon", "zeta", "eta", "theta", "iota", "kappa",
      "lambda", "mu", "nu", "xi", "pi", "rho", "sigma", "tau", "upsilon", "phi", "chi", "psi",
      "omega"
    };
    String letters = "αβγδεζηθικλμνξπρστυφχψω";
    for (int i = 0; i < names.length; i++) {
      LETTERS.put(names[i], letters.substring(i, i + 1));
    }
    String[] capitals = {
      "Gamma", "Delta", "Theta", "Lambda", "Xi", "Pi", "Sigma", "Phi", "Psi", "Omega"
    };
    String capitalLetters = "ΓΔΘΛΞΠΣΦΨΩ";
    for (int i = 0; i < capitals.length; i++) {
      LETTERS.put(capitals[i], capitalLetters.substring(i, i + 1));
    }
  }

  private static final Map<String, String> NAMES =
      LETTERS.entrySet().stream().collect(toMap(Map.Entry::getValue, Map.Entry::getKey));

  private GreekNames() {}

  /** The letters by name, for completion. */
  public static Map<String, String> letters() {
    return Map.copyOf(LETTERS);
  }

  /** A name as one types it on a plain keyboard, {@code omega_max} for {@code ω_max}. */
  public static String spelled(String name) {
    if (name.chars().allMatch(c -> c < 0x80)) {
      return name;
    }
    return name.codePoints()
        .mapToObj(Character::toString)
        .map(letter -> NAMES.getOrDefault(letter, letter))
        .collect(joining());
  }

  /** A name with every spelled letter replaced. */
  public static String fold(String name) {
    var folded = new StringBuilder(name.length());
    int start = 0;
    while (true) {
      int end = name.indexOf('_', start);
      folded.append(foldPart(name.substring(start, end < 0 ? name.length() : end)));
      if (end < 0) {
        return folded.toString();
      }
      folded.append('_');
      start = end + 1;
    }
  }

  private static String foldPart(String part) {
    int letters = part.length();
    while (letters > 0 && part.charAt(letters - 1) >= '0' && part.charAt(letters - 1) <= '9') {
      letters--;
    }
    String letter = LETTERS.get(part.substring(0, letters));
    return letter == null ? part : letter + part.substring(letters);
  }
}
