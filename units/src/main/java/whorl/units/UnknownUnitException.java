package whorl.units;

import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/** A unit with a symbol that the catalogue does not know. */
public final class UnknownUnitException extends IllegalArgumentException {

  private static final long serialVersionUID = 1;

  private final String symbol;
  private final List<String> near;
  private final @Nullable String usualSpelling;

  UnknownUnitException(String symbol, List<String> near, @Nullable String usualSpelling) {
    super(
        "there is no unit \""
            + symbol
            + "\""
            + (near.isEmpty() ? "" : "; near it are " + String.join(", ", near)));
    this.symbol = symbol;
    this.near = List.copyOf(near);
    this.usualSpelling = usualSpelling;
  }

  /** The symbol, as written. */
  public String symbol() {
    return symbol;
  }

  /** Up to four symbols that may be meant, the likeliest first. */
  public List<String> near() {
    return near;
  }

  /**
   * The unit that the trade means by this spelling, where there is one: {@code m^2} for {@code m2},
   * {@code kg} for {@code KG}.
   */
  public Optional<String> usualSpelling() {
    return Optional.ofNullable(usualSpelling);
  }
}
