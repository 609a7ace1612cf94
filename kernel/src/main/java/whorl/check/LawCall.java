package whorl.check;

import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import whorl.laws.Law;
import whorl.laws.Need;
import whorl.laws.Parameter;
import whorl.laws.Sort;
import whorl.laws.ThingSort;
import whorl.syntax.Expr;

/**
 * Checks a call of a law. Of several laws of one name that is meant which takes what the call
 * gives.
 */
final class LawCall {
  private final ExpressionChecker checker;
  private final Space space;
  private final Expr.Call call;
  private final List<Law> laws;
  private final IdentityHashMap<Expr, Typed> checked = new IdentityHashMap<>();

  LawCall(ExpressionChecker checker, Expr.Call call, List<Law> laws) {
    this.checker = checker;
    this.space = new Space(checker);
    this.call = call;
    this.laws = laws;
  }

  Typed typed() {
    LawArguments given = meant();
    var arguments = new ArrayList<Operation.Argument>();
    var files = new ArrayList<Operation.FileArgument>();
    Law law = given.law();
    for (int i = 0; i < law.parameters().size(); i++) {
      if (law.parameters().get(i).sort() instanceof Sort.File) {
        files.add(file(given, i));
      } else {
        argument(given, i).ifPresent(arguments::add);
      }
    }
    var use = new Operation.Use(law, arguments, files);
    Typed result = Space.used(call.span(), use, law.result().sort());
    return result.about(reference(given));
  }

  // Which law is meant.

  private LawArguments meant() {
    var bound = new ArrayList<LawArguments>();
    var failures = new ArrayList<CheckFailure>();
    for (Law law : laws) {
      try {
        bound.add(LawArguments.of(call, law));
      } catch (CheckFailure failure) {
        failures.add(failure);
      }
    }
    if (bound.isEmpty()) {
      throw laws.size() == 1 ? failures.get(0) : LawMessages.noForm(call, laws);
    }
    LawArguments meant = bound.size() == 1 ? bound.get(0) : meant(bound);
    Optional<CheckFailure> incomplete = meant.incomplete(call);
    if (incomplete.isPresent()) {
      throw incomplete.get();
    }
    return meant;
  }

  /**
   * Of several laws the first that takes all that is given, if it can be one that lacks nothing.
   */
  private LawArguments meant(List<LawArguments> bound) {
    if (call.arguments().isEmpty()) {
      return bound.get(0);
    }
    List<LawArguments> fitting = bound.stream().filter(this::fits).toList();
    return Stream.of(
            fitting.stream().filter(given -> given.incomplete(call).isEmpty()),
            fitting.stream(),
            bound.stream().filter(given -> fits(given, firstGiven(given))),
            bound.stream().filter(given -> resembles(given, firstGiven(given))))
        .flatMap(choice -> choice)
        .findFirst()
        .orElseThrow(
            () -> LawMessages.noFormFor(call, laws, check(bound.get(0), firstGiven(bound.get(0)))));
  }

  private static int firstGiven(LawArguments given) {
    int first = 0;
    while (given.values(first).isEmpty()) {
      first++;
    }
    return first;
  }

  private boolean fits(LawArguments given) {
    for (int i = 0; i < given.law().parameters().size(); i++) {
      if (!fits(given, i)) {
        return false;
      }
    }
    return true;
  }

  private boolean fits(LawArguments given, int index) {
    Sort sort = given.law().parameters().get(index).sort();
    return sort instanceof Sort.File
        || given.values(index).stream().allMatch(value -> fits(sort, typed(given, value)));
  }

  /** Whether what is given is a number, a vector or a thing as is wanted, of whatever kind. */
  private boolean resembles(LawArguments given, int index) {
    Sort sort = given.law().parameters().get(index).sort();
    Typed typed = check(given, index);
    return sort instanceof Sort.Real
        ? typed.type() instanceof Type.Real
        : sort instanceof Sort.Vector && typed.type() instanceof Type.Vector;
  }

  private static boolean fits(Sort sort, Typed typed) {
    if (sort instanceof Sort.Real real) {
      return typed.type() instanceof Type.Real && Kinds.fits(typed, real.kinds());
    } else if (sort instanceof Sort.Vector vector) {
      return isForceFor(vector, typed)
          || (typed.type() instanceof Type.Vector && Kinds.fits(typed, vector.kinds()));
    } else if (sort instanceof Sort.Several several) {
      return fits(several.of(), typed);
    }
    ThingSort wanted = ((Sort.Thing) sort).sort();
    return typed.operation() instanceof Operation.Thing thing
        && (thing.sort() == wanted || (wanted == ThingSort.FRAME && Space.servesAsFrame(typed)));
  }

  /** Whether a bound force stands where its force is wanted. */
  private static boolean isForceFor(Sort.Vector wanted, Typed typed) {
    return typed.type() instanceof Type.Thing thing
        && thing.sort() == ThingSort.FORCE
        && wanted.equals(Sort.vector("force"));
  }

  // Arguments.

  /** An argument, checked once; a vector that is written out is stated in the frame of the call. */
  private Typed typed(LawArguments given, Expr value) {
    Typed known = checked.get(value);
    if (known == null) {
      Expr frame = given.value("frame");
      known =
          frame != null && frame != value && Space.isWrittenOut(value)
              ? checker.check(new Expr.InFrame(value.span(), value, frame))
              : checker.check(value, WrittenUnits.Reach.DECLARED);
      checked.put(value, known);
    }
    return known;
  }

  private Typed check(LawArguments given, int index) {
    return typed(given, given.values(index).get(0));
  }

  /** A file, which must be given by its name and lie below the folder of the note. */
  private Operation.FileArgument file(LawArguments given, int index) {
    Expr value = given.values(index).get(0);
    if (!(value instanceof Expr.Text text)) {
      throw LawMessages.wrongCharacter(
          value, typed(given, value), given.law().parameters().get(index), laws);
    }
    return new Operation.FileArgument(
        text.span(), index, new NoteFiles(checker.folder()).named(text));
  }

  private Optional<Operation.Argument> argument(LawArguments given, int index) {
    Law law = given.law();
    Parameter parameter = law.parameters().get(index);
    List<Expr> values = given.values(index);
    if (values.isEmpty()) {
      return leftOut(given, index, parameter);
    }
    boolean list = parameter.sort() instanceof Sort.Several;
    Sort sort = parameter.sort() instanceof Sort.Several several ? several.of() : parameter.sort();
    List<Operation> operations =
        values.stream().map(value -> fitted(given, parameter, sort, value)).toList();
    return Optional.of(new Operation.Argument(index, operations, list));
  }

  private Operation fitted(LawArguments given, Parameter parameter, Sort sort, Expr value) {
    Typed typed = typed(given, value);
    if (sort instanceof Sort.Vector vector && isForceFor(vector, typed)) {
      return space.partNamed(typed, "force", value.span()).operation();
    }
    boolean character =
        sort instanceof Sort.Real
            ? typed.type() instanceof Type.Real
            : sort instanceof Sort.Vector ? typed.type() instanceof Type.Vector : fits(sort, typed);
    if (!character) {
      throw LawMessages.wrongCharacter(value, typed, parameter, laws);
    }
    if (sort instanceof Sort.Real real) {
      Kinds.lawArgument(typed, value, real.kinds(), parameter, given.law());
    } else if (sort instanceof Sort.Vector vector) {
      Kinds.lawArgument(typed, value, vector.kinds(), parameter, given.law());
    } else if (sort.equals(new Sort.Thing(ThingSort.FRAME))) {
      return space.frame(typed).operation();
    }
    return typed.operation();
  }

  /** What stands for an argument that is left out, if it is known from another. */
  private Optional<Operation.Argument> leftOut(LawArguments given, int index, Parameter parameter) {
    if (!(parameter.need() instanceof Need.Known known)) {
      return Optional.empty();
    }
    Expr source = given.value(known.of());
    Typed of = typed(given, Objects.requireNonNull(source));
    Optional<Operation> supplied =
        Optional.ofNullable(of.type().about())
            .flatMap(reference -> supplied(reference, known.supply(), parameter.sort()));
    if (supplied.isEmpty() && known.demanded()) {
      throw LawMessages.demanded(call, given.law(), parameter, source, of);
    }
    return supplied.map(operation -> Operation.Argument.of(index, operation));
  }

  private Optional<Operation> supplied(Reference reference, Need.Supply supply, Sort sort) {
    if (supply == Need.Supply.PLACE) {
      Typed place = space.at(reference.about());
      return fits(sort, place) ? Optional.of(place.operation()) : Optional.empty();
    }
    Anchor anchor = reference.of();
    if (anchor == null || supply == Need.Supply.MOMENTUM) {
      return Optional.empty();
    }
    Typed source = space.at(anchor);
    ThingSort needed = supply == Need.Supply.FORCE ? ThingSort.FORCE : ThingSort.BODY;
    if (((Operation.Thing) source.operation()).sort() != needed) {
      return Optional.empty();
    }
    String part =
        switch (supply) {
          case MASS -> "mass";
          case CENTRE -> "centre";
          case FORCE -> "force";
          case PLACE, MOMENTUM -> throw new IllegalStateException("answered above");
        };
    return Optional.of(space.partNamed(source, part, call.span()).operation());
  }

  // What the result is taken about.

  private @Nullable Reference reference(LawArguments given) {
    Expr place = given.value(given.law().result().about());
    if (place == null) {
      return null;
    }
    Anchor about = space.anchor(typed(given, place), place);
    return about == null ? null : new Reference(about, source(given));
  }

  private @Nullable Anchor source(LawArguments given) {
    Expr of = given.value(given.law().result().of());
    if (of == null) {
      return null;
    }
    Typed typed = typed(given, of);
    if (typed.type() instanceof Type.Thing) {
      return space.anchor(typed, of);
    }
    Reference reference = typed.type().about();
    return reference == null ? null : reference.of();
  }
}
