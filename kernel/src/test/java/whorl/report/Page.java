package whorl.report;

import java.io.StringReader;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import javax.xml.parsers.DocumentBuilderFactory;
import org.w3c.dom.Element;
import org.w3c.dom.Node;
import org.xml.sax.InputSource;

/** A fragment of a page, read as XML: what does not nest or is not escaped cannot be read. */
final class Page {
  private final Element root;

  private Page(Element root) {
    this.root = root;
  }

  static Page of(String fragment) {
    try {
      var reader = new StringReader("<page>" + fragment + "</page>");
      return new Page(
          DocumentBuilderFactory.newInstance()
              .newDocumentBuilder()
              .parse(new InputSource(reader))
              .getDocumentElement());
    } catch (Exception broken) {
      throw new AssertionError("no well-formed fragment: " + fragment, broken);
    }
  }

  /** All text, as copied from the page. */
  String text() {
    return root.getTextContent();
  }

  /** Every element, in order. */
  List<Element> elements() {
    var found = new ArrayList<Element>();
    walk(
        root,
        node -> {
          if (node instanceof Element element && element != root) {
            found.add(element);
          }
        });
    return found;
  }

  private static void walk(Node node, Consumer<Node> visitor) {
    visitor.accept(node);
    for (Node child = node.getFirstChild(); child != null; child = child.getNextSibling()) {
      walk(child, visitor);
    }
  }

  /** What the eye sees: a fraction with a bar as {@code {over|under}}, raised text with a caret. */
  String seen() {
    return seen(root);
  }

  private static String seen(Node node) {
    if (!(node instanceof Element element)) {
      return node.getTextContent();
    }
    var inside = new StringBuilder();
    for (Node child = node.getFirstChild(); child != null; child = child.getNextSibling()) {
      inside.append(seen(child));
    }
    String style = element.getAttribute("style");
    if (style.equals(Look.UNSEEN)) {
      return "";
    }
    if (style.equals(Look.FRACTION)) {
      return "{" + inside + "}";
    }
    if (style.equals(Look.UNDER)) {
      return "|" + inside;
    }
    if (style.equals(Look.BARS)) {
      return "|" + inside + "|";
    }
    if (element.getTagName().equals("sup")) {
      String raised = inside.toString();
      return Superscript.covers(raised) ? Superscript.of(raised) : "^" + raised;
    }
    return inside.toString();
  }
}
