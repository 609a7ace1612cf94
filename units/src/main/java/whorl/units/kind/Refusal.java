package whorl.units.kind;

import java.util.List;
import java.util.Optional;
import whorl.units.Dimension;
import whorl.units.Rational;

/** Why a part of a formula cannot be read. */
public sealed interface Refusal {

  /** Answers one question for every reason. */
  <R> R match(Cases<R> cases);

  /**
   * The reasons.
   *
   * @param <R> type of the answer
   */
  interface Cases<R> {
    R wrongKind(WrongKind refusal);

    R unlike(Unlike refusal);

    R wrongArgument(WrongArgument refusal);

    R numericValue(NumericValue refusal);

    R flywheelEffect(FlywheelEffect refusal);

    R temperatureReading(TemperatureReading refusal);

    R temperatureSum(TemperatureSum refusal);

    R wrongCharacter(WrongCharacter refusal);

    R fractionalPower(FractionalPower refusal);

    R tooManyFactors(TooManyFactors refusal);
  }

  /**
   * A quantity stands where one of another kind is wanted.
   *
   * @param found how it may be read
   * @param wanted the kinds that would do, the usual one first; empty where only the dimension is
   *     known
   * @param dimension wanted
   */
  record WrongKind(Readings found, List<Kind> wanted, Dimension dimension) implements Refusal {
    /** Copies the kinds. */
    public WrongKind {
      wanted = List.copyOf(wanted);
    }

    @Override
    public <R> R match(Cases<R> cases) {
      return cases.wrongKind(this);
    }
  }

  /** Two quantities are added, subtracted or compared that are not alike. */
  record Unlike(Joining joining, Readings left, Readings right) implements Refusal {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.unlike(this);
    }
  }

  /** A function is given a quantity that it cannot take. */
  record WrongArgument(FunctionFamily function, Readings found) implements Refusal {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.wrongArgument(this);
    }
  }

  /**
   * A constant that holds for numbers in fixed units stands in a formula between quantities.
   *
   * @param constant as written
   * @param formula that holds between quantities; empty if it is the one written, without numbers
   */
  record NumericValue(Rational constant, Optional<String> formula) implements Refusal {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.numericValue(this);
    }
  }

  /** A flywheel effect GD² is used as if it were a moment of inertia, of which it is four times. */
  record FlywheelEffect() implements Refusal {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.flywheelEffect(this);
    }
  }

  /** A temperature on a scale, as 20 °C, is multiplied or divided. */
  record TemperatureReading() implements Refusal {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.temperatureReading(this);
    }
  }

  /** Two temperatures on a scale are added, or one is taken from a difference. */
  record TemperatureSum(Joining joining, Readings left, Readings right) implements Refusal {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.temperatureSum(this);
    }
  }

  /**
   * A vector product is read as what only the other vector product can be.
   *
   * @param cross whether it is a cross product; else a dot product
   * @param found what the product could only be
   */
  record WrongCharacter(boolean cross, Readings found) implements Refusal {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.wrongCharacter(this);
    }
  }

  /** A quantity with a unit is raised to a power that no formula of mechanics has. */
  record FractionalPower(Readings base, Rational exponent) implements Refusal {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.fractionalPower(this);
    }
  }

  /** A product has more different factors than are searched. */
  record TooManyFactors(int factors, int most) implements Refusal {
    @Override
    public <R> R match(Cases<R> cases) {
      return cases.tooManyFactors(this);
    }
  }
}
