package whorl.jupyter;

import com.google.gson.JsonArray;
import com.google.gson.JsonNull;
import com.google.gson.JsonObject;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Deque;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** What was run in this kernel, for consoles; the oldest is forgotten when it becomes too much. */
final class History implements Handler {
  private static final int MOST_ENTRIES = 10_000;
  private static final int MOST_CHARACTERS = 1 << 24;

  /** The one session that there is; front ends may also call it 0. */
  private static final int SESSION = 1;

  private record Entry(int count, String code) {}

  private final Deque<Entry> entries = new ArrayDeque<>();
  private long characters;

  void add(int count, String code) {
    entries.addLast(new Entry(count, code));
    characters += code.length();
    while (entries.size() > MOST_ENTRIES || characters > MOST_CHARACTERS) {
      characters -= entries.removeFirst().code().length();
    }
  }

  @Override
  public void handle(Request request) throws BadContentException {
    Content wanted = request.content();
    String access = wanted.text("hist_access_type", "tail");
    List<Entry> found =
        switch (access) {
          case "tail" -> last(wanted.number("n", MOST_ENTRIES), new ArrayList<>(entries));
          case "range" -> range(wanted);
          case "search" -> search(wanted);
          default ->
              throw new BadContentException(
                  "hist_access_type must be tail, range or search, but is " + access);
        };
    var content = new JsonObject();
    content.add("history", list(found, wanted.flag("output", false)));
    request.succeed(content);
  }

  private static List<Entry> last(int number, List<Entry> all) {
    int first = Math.max(0, all.size() - Math.max(0, number));
    return all.subList(first, all.size());
  }

  /** From one count to before another; below zero they are counted from the end. */
  private List<Entry> range(Content wanted) throws BadContentException {
    int session = wanted.number("session", 0);
    int next = entries.isEmpty() ? 1 : entries.getLast().count() + 1;
    int start = fromStart(wanted.number("start", 0), next);
    int stop = fromStart(wanted.number("stop", next), next);
    boolean known = session == 0 || session == SESSION;
    return entries.stream()
        .filter(entry -> known && entry.count() >= start && entry.count() < stop)
        .toList();
  }

  private static int fromStart(int count, int next) {
    return count < 0 ? next + count : count;
  }

  private List<Entry> search(Content wanted) throws BadContentException {
    var pattern = new Wildcards(wanted.text("pattern", "*"));
    boolean unique = wanted.flag("unique", false);
    Set<String> seen = new HashSet<>();
    var found = new ArrayList<Entry>();
    // From the newest, so that of equal ones the newest stays.
    entries
        .descendingIterator()
        .forEachRemaining(
            entry -> {
              if (pattern.match(entry.code()) && (!unique || seen.add(entry.code()))) {
                found.add(entry);
              }
            });
    Collections.reverse(found);
    return last(wanted.number("n", MOST_ENTRIES), found);
  }

  private static JsonArray list(List<Entry> entries, boolean withOutput) {
    var list = new JsonArray();
    for (Entry entry : entries) {
      var item = new JsonArray();
      item.add(SESSION);
      item.add(entry.count());
      if (withOutput) {
        // What cells showed is kept by front ends only.
        var both = new JsonArray();
        both.add(entry.code());
        both.add(JsonNull.INSTANCE);
        item.add(both);
      } else {
        item.add(entry.code());
      }
      list.add(item);
    }
    return list;
  }
}
