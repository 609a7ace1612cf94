package whorl.check;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import java.util.stream.Stream;
import whorl.syntax.Expr;
import whorl.syntax.MotionLine;
import whorl.syntax.Statement;

/** Walks over expressions that ask the same of every form. */
final class Expressions {
  private static final Parts PARTS = new Parts();

  private Expressions() {}

  /** The expressions that directly make up another, in the order written. */
  static List<Expr> parts(Expr expr) {
    return expr.match(PARTS);
  }

  /** Visits an expression and all its parts, in the order written, whatever their depth. */
  static void walk(Expr root, Consumer<Expr> visitor) {
    var open = new ArrayList<Expr>(List.of(root));
    while (!open.isEmpty()) {
      Expr expr = open.remove(open.size() - 1);
      visitor.accept(expr);
      List<Expr> parts = parts(expr);
      for (int i = parts.size() - 1; i >= 0; i--) {
        open.add(parts.get(i));
      }
    }
  }

  /** The expressions of a statement, in the order written; none for a statement of other kinds. */
  static List<Expr> of(Statement statement) {
    if (statement instanceof Statement.Definition definition) {
      return List.of(definition.value());
    } else if (statement instanceof Statement.Function function) {
      return List.of(function.body());
    } else if (statement instanceof Statement.Show show) {
      return List.of(show.value());
    } else if (statement instanceof Statement.Check check) {
      return List.of(check.condition());
    } else if (statement instanceof Statement.Reproduction reproduction) {
      return List.of(reproduction.value(), reproduction.stated(), reproduction.within());
    } else if (statement instanceof Statement.Assumption assumption) {
      return List.of(assumption.condition());
    } else if (statement instanceof Statement.Sketch sketch) {
      return sketch.things();
    }
    return statement instanceof Statement.Motion motion
        ? motion.lines().stream().flatMap(line -> line.match(LINES)).toList()
        : List.of();
  }

  private static final MotionLine.Cases<Stream<Expr>> LINES =
      new MotionLine.Cases<>() {
        @Override
        public Stream<Expr> start(MotionLine.Start start) {
          return Stream.of(start.value());
        }

        @Override
        public Stream<Expr> attitude(MotionLine.Attitude attitude) {
          MotionLine.Turn turn = attitude.turn();
          return Stream.concat(
              Stream.ofNullable(attitude.spin()),
              turn == null ? Stream.of() : Stream.of(turn.angle(), turn.about()));
        }

        @Override
        public Stream<Expr> equation(MotionLine.Equation equation) {
          return Stream.of(equation.rate(), equation.value());
        }

        @Override
        public Stream<Expr> local(MotionLine.Local local) {
          return Stream.of(local.value());
        }

        @Override
        public Stream<Expr> stop(MotionLine.Stop stop) {
          return Stream.of(stop.condition());
        }

        @Override
        public Stream<Expr> limit(MotionLine.Limit limit) {
          return Stream.of(limit.time());
        }

        @Override
        public Stream<Expr> body(MotionLine.Body body) {
          return Stream.of(body.name(), body.about());
        }

        @Override
        public Stream<Expr> load(MotionLine.Load load) {
          return Stream.of(load.value());
        }
      };

  /**
   * Whether an expression is made only of bare numbers, so that it takes the declared unit: numbers
   * without units, signs, the four operations, powers, vectors of such, and choices between such.
   */
  static boolean isBare(Expr expr) {
    if (expr instanceof Expr.Numeral numeral) {
      return numeral.unit() == null;
    } else if (expr instanceof Expr.Choice choice) {
      return isBare(choice.then()) && isBare(choice.otherwise());
    } else if (expr instanceof Expr.Negation
        || expr instanceof Expr.Sum
        || expr instanceof Expr.Product
        || expr instanceof Expr.Power
        || expr instanceof Expr.Vector) {
      return parts(expr).stream().allMatch(Expressions::isBare);
    }
    return false;
  }

  /** Whether an expression is an input: a number or vector written out, with its unit if any. */
  static boolean isInput(Expr expr) {
    if (expr instanceof Expr.Numeral) {
      return true;
    } else if (expr instanceof Expr.Negation negation) {
      return isInput(negation.operand());
    } else if (expr instanceof Expr.InUnit inUnit) {
      return isInput(inUnit.group());
    } else if (expr instanceof Expr.Vector || expr instanceof Expr.Tolerance) {
      return parts(expr).stream().allMatch(Expressions::isInput);
    } else if (expr instanceof Expr.Choice) {
      return false;
    }
    return isBare(expr);
  }

  private static final class Parts implements Expr.Cases<List<Expr>> {
    @Override
    public List<Expr> numeral(Expr.Numeral numeral) {
      return List.of();
    }

    @Override
    public List<Expr> inUnit(Expr.InUnit inUnit) {
      return List.of(inUnit.group());
    }

    @Override
    public List<Expr> name(Expr.Name name) {
      return List.of();
    }

    @Override
    public List<Expr> part(Expr.Part part) {
      return List.of(part.of());
    }

    @Override
    public List<Expr> rate(Expr.Rate rate) {
      return List.of(rate.of());
    }

    @Override
    public List<Expr> inFrame(Expr.InFrame inFrame) {
      return List.of(inFrame.vector(), inFrame.frame());
    }

    @Override
    public List<Expr> vector(Expr.Vector vector) {
      return List.of(vector.x(), vector.y(), vector.z());
    }

    @Override
    public List<Expr> negation(Expr.Negation negation) {
      return List.of(negation.operand());
    }

    @Override
    public List<Expr> sum(Expr.Sum sum) {
      return sum.terms().stream().map(Expr.Term::value).toList();
    }

    @Override
    public List<Expr> product(Expr.Product product) {
      return product.factors().stream().map(Expr.Factor::value).toList();
    }

    @Override
    public List<Expr> power(Expr.Power power) {
      return List.of(power.base(), power.exponent());
    }

    @Override
    public List<Expr> magnitude(Expr.Magnitude magnitude) {
      return List.of(magnitude.operand());
    }

    @Override
    public List<Expr> tolerance(Expr.Tolerance tolerance) {
      return List.of(tolerance.value(), tolerance.half());
    }

    @Override
    public List<Expr> comparison(Expr.Comparison comparison) {
      return List.of(comparison.left(), comparison.right());
    }

    @Override
    public List<Expr> allOf(Expr.AllOf allOf) {
      return allOf.conditions();
    }

    @Override
    public List<Expr> anyOf(Expr.AnyOf anyOf) {
      return anyOf.conditions();
    }

    @Override
    public List<Expr> choice(Expr.Choice choice) {
      return List.of(choice.condition(), choice.then(), choice.otherwise());
    }

    @Override
    public List<Expr> call(Expr.Call call) {
      return Stream.concat(
              call.arguments().stream().map(Expr.Argument::value),
              Stream.ofNullable(call.over()).map(Expr.class::cast))
          .toList();
    }

    @Override
    public List<Expr> text(Expr.Text text) {
      return List.of();
    }

    @Override
    public List<Expr> truth(Expr.Truth truth) {
      return List.of();
    }
  }
}
