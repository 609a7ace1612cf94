package whorl.sheet;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Collection;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import whorl.syntax.Statement;

/**
 * Which statement defines a name and which statements use it. Walks cost what they reach, not the
 * size of the sheet.
 */
final class Graph {
  private final Map<String, Node> definitions = new TreeMap<>();
  private final Map<String, Set<Node>> users = new HashMap<>();
  private final Set<Node> assumptions = new LinkedHashSet<>();

  void add(Collection<Node> nodes) {
    for (Node node : nodes) {
      node.defines().ifPresent(name -> definitions.put(name, node));
      for (String name : node.uses()) {
        users.computeIfAbsent(name, key -> new LinkedHashSet<>()).add(node);
      }
      if (node.statement() instanceof Statement.Assumption) {
        assumptions.add(node);
      }
    }
  }

  void remove(Collection<Node> nodes) {
    for (Node node : nodes) {
      node.defines().ifPresent(name -> definitions.remove(name, node));
      for (String name : node.uses()) {
        Set<Node> left = users.get(name);
        if (left != null && left.remove(node) && left.isEmpty()) {
          users.remove(name);
        }
      }
      assumptions.remove(node);
    }
  }

  Optional<Node> definition(String name) {
    return Optional.ofNullable(definitions.get(name));
  }

  /** The names that have a definition, in alphabetical order. */
  Collection<String> names() {
    return definitions.keySet();
  }

  /** The assumptions. */
  Set<Node> assumptions() {
    return assumptions;
  }

  /** The statements that use a name. */
  Set<Node> users(String name) {
    return users.getOrDefault(name, Set.of());
  }

  /** The statements that depend on some names, directly or through other definitions. */
  Set<Node> downstream(Collection<String> names) {
    var reached = new LinkedHashSet<Node>();
    var open = new ArrayDeque<String>(names);
    var seen = new HashSet<String>(names);
    while (!open.isEmpty()) {
      for (Node user : users(open.remove())) {
        if (reached.add(user)) {
          user.defines().filter(seen::add).ifPresent(open::add);
        }
      }
    }
    return reached;
  }

  /** An order of evaluation, or the cycle that prevents one. */
  sealed interface Order {
    /** Every node behind those it depends on. */
    record Sorted(List<Node> nodes) implements Order {}

    /** Definitions that depend on each other in a ring, each using the one behind it. */
    record Cycle(List<Node> nodes) implements Order {}
  }

  /** Sorts some nodes so that each stands behind those of them that it depends on. */
  Order order(Collection<Node> nodes) {
    var waitsFor = new LinkedHashMap<Node, Integer>();
    var unlocks = new HashMap<Node, List<Node>>();
    var among = new HashSet<>(nodes);
    for (Node node : nodes) {
      int count = 0;
      for (Node needed : needs(node)) {
        if (among.contains(needed)) {
          unlocks.computeIfAbsent(needed, key -> new ArrayList<>()).add(node);
          count++;
        }
      }
      waitsFor.put(node, count);
    }
    var ready = new ArrayDeque<Node>();
    waitsFor.forEach(
        (node, count) -> {
          if (count == 0) {
            ready.add(node);
          }
        });
    var sorted = new ArrayList<Node>();
    while (!ready.isEmpty()) {
      Node node = ready.remove();
      sorted.add(node);
      waitsFor.remove(node);
      for (Node next : unlocks.getOrDefault(node, List.of())) {
        if (waitsFor.merge(next, -1, Integer::sum) == 0) {
          ready.add(next);
        }
      }
    }
    return waitsFor.isEmpty() ? new Order.Sorted(sorted) : new Order.Cycle(ring(waitsFor.keySet()));
  }

  private List<Node> needs(Node node) {
    return node.uses().stream().sorted().flatMap(name -> definition(name).stream()).toList();
  }

  /**
   * A ring among nodes each of which needs at least one other that is left or lies behind a ring.
   */
  private List<Node> ring(Set<Node> left) {
    var path = new ArrayList<Node>();
    var position = new HashMap<Node, Integer>();
    Node node = left.iterator().next();
    while (!position.containsKey(node)) {
      position.put(node, path.size());
      path.add(node);
      node = needs(node).stream().filter(left::contains).findFirst().orElseThrow();
    }
    return List.copyOf(path.subList(position.get(node), path.size()));
  }
}
