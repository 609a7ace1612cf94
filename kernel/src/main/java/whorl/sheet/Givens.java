package whorl.sheet;

import java.util.ArrayList;
import java.util.List;
import whorl.check.Checked;
import whorl.check.ConstantAtHand;
import whorl.check.Meaning;
import whorl.check.Mentions;
import whorl.syntax.Statement;
import whorl.units.Unit;

/** Finds what went into a statement. */
final class Givens {
  private Givens() {}

  /**
   * What a statement itself names, with the quantities that stand for it: names of the sheet, then
   * constants that have a unit.
   */
  static List<Given> of(Statement statement, Checked checked, Results results) {
    var given = new ArrayList<Given>();
    for (Meaning.Input input : checked.basis().inputs()) {
      if (input.direct()) {
        results
            .quantity(input.name())
            .ifPresent(quantity -> given.add(new Given(input.name(), quantity)));
      }
    }
    for (ConstantAtHand constant : ConstantAtHand.all()) {
      boolean named = Mentions.ofName(constant.symbol(), statement).isPresent();
      if (named && !constant.unit().equals(Unit.ONE)) {
        given.add(new Given(constant.symbol(), Quantities.of(constant)));
      }
    }
    return given;
  }
}
