package whorl.eval;

import java.util.function.Function;
import whorl.check.Operation.ThingCall;
import whorl.check.Operation.ThingCases;
import whorl.check.Operation.ThingChoice;
import whorl.check.Operation.ThingInput;
import whorl.check.Operation.ThingUse;
import whorl.laws.ThingSort;
import whorl.laws.Work;

/** Writes the code of operations that give things in space. */
final class ThingCodeWriter implements ThingCases<Code.Thing> {
  private final CodeWriter writer;

  ThingCodeWriter(CodeWriter writer) {
    this.writer = writer;
  }

  /** Code of one sort of thing. */
  private record Of(ThingSort sort, Function<Activation, Object> code) implements Code.Thing {
    @Override
    public Object in(Activation activation) {
      return code.apply(activation);
    }
  }

  @Override
  public Code.Thing input(ThingInput input) {
    int slot = input.slot();
    return new Of(input.sort(), in -> in.things()[slot]);
  }

  @Override
  public Code.Thing choice(ThingChoice choice) {
    Code.Truth condition = writer.truth(choice.condition());
    Code.Thing then = writer.thing(choice.then());
    Code.Thing otherwise = writer.thing(choice.otherwise());
    return new Of(choice.sort(), in -> condition.in(in) ? then.in(in) : otherwise.in(in));
  }

  @Override
  public Code.Thing call(ThingCall call) {
    CallCode code = CallCode.of(call.callee(), call.arguments(), writer);
    return new Of(call.sort(), code::thing);
  }

  @Override
  public Code.Thing use(ThingUse use) {
    UseCode code = writer.use(use.span(), use.use());
    var work = (Work.Thing) use.use().rule().work();
    return new Of(use.sort(), in -> code.thing(in, work));
  }
}
