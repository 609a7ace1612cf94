package whorl.check;

import java.util.Optional;
import whorl.syntax.Expr;
import whorl.units.Unit;

/** Names that mean something in a part of a statement only, where they hide those of the sheet. */
interface Locals {
  /** What a name stands for, or empty where it is no local one. */
  Optional<Typed> value(Expr.Name name);

  /** A part of what a local name stands for that only it has, or empty. */
  default Optional<Typed> part(Expr.Part part) {
    return Optional.empty();
  }

  /** The unit that the author chose for it, if any. */
  Optional<Unit> unit(String name);

  /** No such names. */
  Locals NONE =
      new Locals() {
        @Override
        public Optional<Typed> value(Expr.Name name) {
          return Optional.empty();
        }

        @Override
        public Optional<Unit> unit(String name) {
          return Optional.empty();
        }
      };
}
