package whorl.report.sketch;

import java.util.List;
import java.util.Locale;
import org.apache.commons.math3.geometry.euclidean.twod.Vector2D;

/** SVG while it is written. Names of users go in escaped; everything else is ours. */
final class Svg {
  private static final String TEXT =
      "font-family:'STIX Two Text','Cambria','Libertinus Serif','Times New Roman',"
          + "'Liberation Serif',serif";

  private final StringBuilder markup = new StringBuilder();

  /**
   * A line through points.
   *
   * @param style presentation attributes
   */
  void line(List<Vector2D> points, String style) {
    markup.append("<path d=\"").append(path(points)).append("\" ").append(style).append("/>");
  }

  /** Many lines of one look. */
  void lines(List<Stroke> strokes, String style) {
    if (strokes.isEmpty()) {
      return;
    }
    markup.append("<path d=\"");
    for (Stroke stroke : strokes) {
      markup.append(path(stroke.points()));
    }
    markup.append("\" ").append(style).append("/>");
  }

  private static String path(List<Vector2D> points) {
    StringBuilder path = new StringBuilder();
    for (int i = 0; i < points.size(); i++) {
      boolean closes =
          i > 1 && i == points.size() - 1 && points.get(i).distance(points.get(0)) < 0.05;
      if (closes) {
        path.append('Z');
      } else {
        path.append(i == 0 ? 'M' : 'L').append(number(points.get(i)));
      }
    }
    return path.toString();
  }

  /** A filled area. */
  void area(List<Vector2D> points, String style) {
    markup.append("<path d=\"").append(path(points)).append("Z\" ").append(style).append("/>");
  }

  void dot(Vector2D at, double radius, String style) {
    markup
        .append("<circle cx=\"")
        .append(number(at.getX()))
        .append("\" cy=\"")
        .append(number(at.getY()))
        .append("\" r=\"")
        .append(number(radius))
        .append("\" ")
        .append(style)
        .append("/>");
  }

  /**
   * A name with its subscript, and a size behind it.
   *
   * @param at the left end of the base line
   */
  void label(Vector2D at, Label label, String fill) {
    markup
        .append("<text x=\"")
        .append(number(at.getX()))
        .append("\" y=\"")
        .append(number(at.getY()))
        .append("\" font-size=\"15\" fill=\"")
        .append(fill)
        .append("\"><tspan font-style=\"italic\"")
        .append(label.bold() ? " font-weight=\"bold\">" : ">")
        .append(escaped(label.base()))
        .append("</tspan>");
    if (!label.subscript().isEmpty()) {
      markup
          .append("<tspan dy=\"4\" font-size=\"11\">")
          .append(escaped(label.subscript()))
          .append("</tspan>");
    }
    if (!label.size().isEmpty()) {
      markup
          .append("<tspan dx=\"6\"")
          .append(label.subscript().isEmpty() ? "" : " dy=\"-4\"")
          .append(" font-size=\"12.5\">")
          .append(escaped(label.size()))
          .append("</tspan>");
    }
    markup.append("</text>");
  }

  /** All in a picture that shows a part of the drawing. */
  String picture(double left, double top, double width, double height, String title) {
    return "<svg xmlns=\"http://www.w3.org/2000/svg\" role=\"img\" viewBox=\""
        + number(left)
        + " "
        + number(top)
        + " "
        + number(width)
        + " "
        + number(height)
        + "\" style=\"display:block;width:100%;max-width:"
        + number(width)
        + "px;height:auto;color:inherit;"
        + TEXT
        + "\" fill=\"none\" stroke-linecap=\"round\" stroke-linejoin=\"round\"><title>"
        + escaped(title)
        + "</title>"
        + markup
        + "</svg>";
  }

  private static String number(Vector2D at) {
    return number(at.getX()) + " " + number(at.getY());
  }

  private static String number(double value) {
    String text = String.format(Locale.ROOT, "%.1f", value);
    String plain = text.endsWith(".0") ? text.substring(0, text.length() - 2) : text;
    return plain.equals("-0") ? "0" : plain;
  }

  private static String escaped(String text) {
    StringBuilder escaped = new StringBuilder();
    text.codePoints()
        .forEach(
            c -> {
              switch (c) {
                case '&' -> escaped.append("&amp;");
                case '<' -> escaped.append("&lt;");
                case '>' -> escaped.append("&gt;");
                case '"' -> escaped.append("&quot;");
                default -> escaped.appendCodePoint(Character.isISOControl(c) ? 0xFFFD : c);
              }
            });
    return escaped.toString();
  }
}
