package whorl.units;

import java.util.ArrayList;
import java.util.List;

/**
 * Sums the exponents of members that bear the same name. Units have few members, so that two lists
 * serve better than a map.
 */
final class Exponents {

  private final List<String> names = new ArrayList<>(4);
  private final List<Integer> sums = new ArrayList<>(4);

  void add(String name, int exponent) {
    int place = names.indexOf(name);
    if (place < 0) {
      names.add(name);
      sums.add(exponent);
    } else {
      sums.set(place, Math.addExact(sums.get(place), exponent));
    }
  }

  boolean sharesNameWith(Exponents other) {
    for (String name : names) {
      if (other.names.contains(name)) {
        return true;
      }
    }
    return false;
  }

  /**
   * The powers in the order in which their names came; those that have cancelled are left out. A
   * sum too large for one member gives several.
   */
  List<UnitText.Power> powers() {
    int largest = UnitText.LARGEST_EXPONENT;
    List<UnitText.Power> powers = new ArrayList<>();
    for (int i = 0; i < names.size(); i++) {
      int rest = sums.get(i);
      while (rest != 0) {
        int part = Math.max(-largest, Math.min(rest, largest));
        powers.add(new UnitText.Power(names.get(i), part));
        rest -= part;
      }
    }
    return powers;
  }

  /** A text for comparing, in the order in which the names came. */
  String inOrder() {
    return String.join(" ", texts());
  }

  /** A text for comparing, whatever the order. */
  String sorted() {
    List<String> texts = texts();
    texts.sort(null);
    return String.join(" ", texts);
  }

  private List<String> texts() {
    List<String> texts = new ArrayList<>(names.size());
    for (int i = 0; i < names.size(); i++) {
      if (sums.get(i) != 0) {
        texts.add(names.get(i) + "^" + sums.get(i));
      }
    }
    return texts;
  }
}
