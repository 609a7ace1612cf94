package whorl.java;

import java.lang.reflect.Array;
import java.util.Collection;
import java.util.Iterator;
import java.util.Map;
import org.dflib.jjava.jupyter.kernel.display.DisplayData;
import org.dflib.jjava.jupyter.kernel.display.Renderer;
import org.dflib.jjava.jupyter.kernel.display.mime.MIMEType;
import org.jspecify.annotations.Nullable;

/**
 * Renders values as the display library does, and writes arrays and collections out where no plain
 * text is given; a long one is cut.
 */
final class PlainTexts extends Renderer {
  private static final int MOST_MEMBERS = 1000;
  private static final int DEEPEST = 20;

  @Override
  protected DisplayData finalizeDisplayData(DisplayData display, @Nullable Object value) {
    if (!display.hasDataForType(MIMEType.TEXT_PLAIN)) {
      display.putText(of(value));
    }
    return display;
  }

  /** A value as text. */
  static String of(@Nullable Object value) {
    var text = new StringBuilder();
    write(value, 0, text);
    return text.toString();
  }

  private static void write(@Nullable Object value, int depth, StringBuilder text) {
    if (value == null || depth > DEEPEST) {
      text.append(value == null ? "null" : "…");
    } else if (value.getClass().isArray()) {
      int length = Array.getLength(value);
      text.append('[');
      for (int i = 0; i < Math.min(length, MOST_MEMBERS); i++) {
        text.append(i == 0 ? "" : ", ");
        write(Array.get(value, i), depth + 1, text);
      }
      text.append(more(length)).append(']');
    } else if (value instanceof Collection<?> collection && isOfJava(value)) {
      text.append('[');
      writeMembers(collection.iterator(), depth, text);
      text.append(more(collection.size())).append(']');
    } else if (value instanceof Map<?, ?> map && isOfJava(value)) {
      text.append('{');
      writeMembers(map.entrySet().iterator(), depth, text);
      text.append(more(map.size())).append('}');
    } else if (value instanceof Map.Entry<?, ?> entry && isOfJava(value)) {
      write(entry.getKey(), depth + 1, text);
      text.append('=');
      write(entry.getValue(), depth + 1, text);
    } else {
      text.append(value);
    }
  }

  /** Only the collections of Java itself; others may have a text of their own. */
  private static boolean isOfJava(Object value) {
    return value.getClass().getName().startsWith("java.util.");
  }

  private static void writeMembers(Iterator<?> members, int depth, StringBuilder text) {
    for (int i = 0; i < MOST_MEMBERS && members.hasNext(); i++) {
      text.append(i == 0 ? "" : ", ");
      write(members.next(), depth + 1, text);
    }
  }

  private static String more(int size) {
    return size > MOST_MEMBERS ? ", … " + (size - MOST_MEMBERS) + " more" : "";
  }
}
