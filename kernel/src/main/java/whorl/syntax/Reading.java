package whorl.syntax;

import java.util.List;
import java.util.Set;
import java.util.function.Predicate;
import whorl.diagnostic.Diagnostic;

/**
 * What the reading of one text shares between its parts.
 *
 * @param names the names of the sheet and of the text itself
 * @param unitWords takes the words read as units for want of such a name
 * @param errors takes what is wrong
 */
record Reading(
    SyntaxMessages messages,
    Predicate<String> names,
    UnitWords units,
    List<UnitWord> unitWords,
    List<Diagnostic> errors) {

  /** The same reading where a function or a motion has names of its own. */
  Reading with(Set<String> local) {
    return new Reading(
        messages, name -> local.contains(name) || names.test(name), units, unitWords, errors);
  }
}
