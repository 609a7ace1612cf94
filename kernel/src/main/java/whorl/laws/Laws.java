package whorl.laws;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/** The catalogue of laws. */
public final class Laws {
  private static final List<Law> ALL =
      Stream.of(
              ReferenceLaws.all(),
              ShapeLaws.all(),
              BodyLaws.all(),
              MomentumLaws.all(),
              ChangingInertiaLaws.all(),
              GyroLaws.all())
          .flatMap(List::stream)
          .toList();

  private static final Map<String, List<Law>> BY_NAME =
      ALL.stream()
          .collect(Collectors.groupingBy(Law::name, LinkedHashMap::new, Collectors.toList()));

  private Laws() {}

  /** All laws, room by room. */
  public static List<Law> all() {
    return ALL;
  }

  /** The names of all laws. */
  public static List<String> names() {
    return List.copyOf(BY_NAME.keySet());
  }

  /** The laws of a name; none where it is the name of no law. */
  public static List<Law> named(String name) {
    return BY_NAME.getOrDefault(name, List.of());
  }
}
