package whorl.eval;

import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.List;
import whorl.check.Operation;
import whorl.check.Operation.Body;
import whorl.diagnostic.Span;

/**
 * Turns checked trees into {@link Code}. Bodies of functions are written once each, however often
 * they are called, and not from within their callers, so that long chains of functions cost no
 * stack here.
 */
final class CodeWriter {
  private final RealCodeWriter reals = new RealCodeWriter(this);
  private final VectorCodeWriter vectors = new VectorCodeWriter(this);
  private final TruthCodeWriter truths = new TruthCodeWriter(this);
  private final ThingCodeWriter things = new ThingCodeWriter(this);

  // Two equal bodies may be one for our purpose, but comparing deep trees costs more than it saves.
  private final IdentityHashMap<Body, Integer> numbers = new IdentityHashMap<>();
  private final List<Body> bodies = new ArrayList<>();

  private String inFunction = "";
  private int formulas;
  private int operations;
  private int level;
  private int deepest;

  /** Writes a formula as procedure 0 and behind it the bodies of all functions it leads to. */
  Procedure[] write(Operation formula) {
    return write(List.of(formula));
  }

  /** The same for several formulas, which are the first procedures in their order. */
  Procedure[] write(List<? extends Operation> roots) {
    formulas = roots.size();
    List<Procedure> procedures = new ArrayList<>();
    roots.forEach(formula -> procedures.add(procedure("", formula)));
    for (int i = 0; i < bodies.size(); i++) {
      procedures.add(procedure(bodies.get(i).name(), bodies.get(i).body()));
    }
    return procedures.toArray(Procedure[]::new);
  }

  private Procedure procedure(String name, Operation body) {
    inFunction = name;
    operations = 0;
    deepest = 0;
    return new Procedure(any(body), operations, deepest);
  }

  /** The number under which a body will be found. */
  int numberOf(Body body) {
    return numbers.computeIfAbsent(
        body,
        added -> {
          bodies.add(added);
          return formulas + bodies.size() - 1;
        });
  }

  /** How deep the operation being written nests in its formula or body. */
  int level() {
    return level;
  }

  Site site(Span span) {
    return new Site(span, inFunction);
  }

  Code any(Operation operation) {
    if (operation instanceof Operation.Real real) {
      return real(real);
    }
    if (operation instanceof Operation.Vector vector) {
      return vector(vector);
    }
    return operation instanceof Operation.Thing thing
        ? thing(thing)
        : truth((Operation.Truth) operation);
  }

  Code.Real real(Operation.Real operation) {
    enter();
    Code.Real code = operation.match(reals);
    level--;
    return code;
  }

  Code.Vector vector(Operation.Vector operation) {
    enter();
    Code.Vector code = operation.match(vectors);
    level--;
    return code;
  }

  Code.Truth truth(Operation.Truth operation) {
    enter();
    Code.Truth code = operation.match(truths);
    level--;
    return code;
  }

  Code.Thing thing(Operation.Thing operation) {
    enter();
    Code.Thing code = operation.match(things);
    level--;
    return code;
  }

  /** A rule at work. */
  UseCode use(Span span, Operation.Use use) {
    return UseCode.of(site(span), use, this);
  }

  private void enter() {
    operations++;
    level++;
    deepest = Math.max(deepest, level);
  }
}
