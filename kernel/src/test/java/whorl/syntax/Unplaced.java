package whorl.syntax;

import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.RecordComponent;
import java.util.ArrayList;
import java.util.List;
import whorl.diagnostic.Span;

/** Trees without the places where their parts stand, so that two readings can be compared. */
final class Unplaced {
  private Unplaced() {}

  static List<Object> statements(Parsed parsed) {
    return parsed.statements().stream().map(Unplaced::of).toList();
  }

  /** A tree as nested lists of record names and components, spans left out. */
  static Object of(Object part) {
    if (part instanceof List<?> list) {
      return list.stream().map(Unplaced::of).toList();
    }
    if (!part.getClass().isRecord()) {
      return part;
    }
    var parts = new ArrayList<Object>();
    parts.add(part.getClass().getSimpleName());
    for (RecordComponent component : part.getClass().getRecordComponents()) {
      if (component.getType() != Span.class) {
        Object value = value(part, component);
        parts.add(value == null ? "none" : of(value));
      }
    }
    return parts;
  }

  private static Object value(Object part, RecordComponent component) {
    try {
      var accessor = component.getAccessor();
      accessor.setAccessible(true);
      return accessor.invoke(part);
    } catch (IllegalAccessException | InvocationTargetException e) {
      throw new IllegalStateException(e);
    }
  }
}
