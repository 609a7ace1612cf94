package whorl.mechanics;

import static org.junit.jupiter.api.Assertions.assertEquals;

import com.google.gson.Gson;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.Reader;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.NoSuchElementException;
import java.util.Objects;
import whorl.units.UnitCatalogue;
import whorl.units.UnitReader;

/**
 * Cases of {@code motion-cases.json}: published numbers and closed-form laws, each with its source
 * and how that was read.
 */
public final class CheckCases {
  private static final List<Case> CASES = read();

  private CheckCases() {}

  /** A case as written in the file. */
  public record Case(
      String id, String title, Map<String, String> given, Map<String, Expected> expect) {
    /** A given value, in coherent SI units. */
    public double given(String name) {
      String text = Objects.requireNonNull(given.get(name), name);
      int blank = text.indexOf(' ');
      return inSi(Double.parseDouble(text.substring(0, blank)), text.substring(blank + 1));
    }

    /** Asserts that a value in coherent SI units is the expected one, to its own tolerance. */
    public void holds(String name, double si) {
      holds(name, si, 0);
    }

    /** Asserts it to its own tolerance or a wider one, relative to the expected value. */
    public void holds(String name, double si, double widened) {
      Expected expected = Objects.requireNonNull(expect.get(name), name);
      double value = inSi(Double.parseDouble(expected.value()), expected.unit());
      double allowed =
          Math.max(Math.max(expected.rel_tol(), widened) * Math.abs(value), expected.abs_tol());
      assertEquals(value, si, allowed, id + " " + name);
    }

    /** The expected value, in coherent SI units. */
    public double expected(String name) {
      Expected expected = Objects.requireNonNull(expect.get(name), name);
      return inSi(Double.parseDouble(expected.value()), expected.unit());
    }
  }

  /** An expected value. */
  public record Expected(String value, String unit, double rel_tol, double abs_tol) {}

  /** The case with an id. */
  public static Case named(String id) {
    return CASES.stream()
        .filter(one -> one.id().equals(id))
        .findFirst()
        .orElseThrow(() -> new NoSuchElementException(id));
  }

  private static double inSi(double value, String unit) {
    return unit.equals("1")
        ? value
        : UnitCatalogue.standard().resolve(UnitReader.read(unit)).toSi(value);
  }

  private static List<Case> read() {
    var file =
        Objects.requireNonNull(
            CheckCases.class.getResourceAsStream("/whorl/mechanics/motion-cases.json"));
    try (Reader reader = new InputStreamReader(file, StandardCharsets.UTF_8)) {
      return Arrays.asList(new Gson().fromJson(reader, Case[].class));
    } catch (IOException unreadable) {
      throw new IllegalStateException(unreadable);
    }
  }
}
