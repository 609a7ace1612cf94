package whorl.syntax;

import java.util.ArrayList;
import java.util.List;
import whorl.diagnostic.Span;
import whorl.syntax.Token.Kind;

/** A row of a case set or of data. */
final class RowParser extends LineParser {
  RowParser(LogicalLine line, Reading reading) {
    super(line, reading, false);
  }

  // row of cases = label expression { "," expression }
  Statement.CaseRow caseRow(int columns) {
    Token label = cursor.peek();
    if (label.isReservedWord()) {
      throw cursor.refusal(messages.reserved(label.span(), label.text()));
    }
    if (!label.is(Kind.NAME) && !label.is(Kind.TEXT)) {
      throw cursor.refusal(messages.rowWithoutLabel(label.span()));
    }
    cursor.take();
    Token next = cursor.peek();
    if (label.is(Kind.NAME) && next.is(Kind.OPEN) && label.touches(next)) {
      Span place = label.span().to(next.span());
      throw cursor.refusal(messages.rowLabelLikeCall(place, label.span()));
    }
    List<Expr> values = cursor.atEnd() ? List.of() : values();
    if (values.size() != columns) {
      throw new Refusal(messages.rowSize(line.span(), values.size(), columns));
    }
    Expr name = label.is(Kind.NAME) ? label.name() : new Expr.Text(label.span(), label.text());
    return new Statement.CaseRow(line.span(), name, values, line.remark());
  }

  // row of data = expression { "," expression }
  Statement.DataRow dataRow(int columns) {
    List<Expr> values = values();
    if (values.size() != columns) {
      throw new Refusal(messages.rowSize(line.span(), values.size(), columns));
    }
    return new Statement.DataRow(line.span(), values, line.remark());
  }

  private List<Expr> values() {
    var values = new ArrayList<Expr>();
    do {
      values.add(expressions.expression());
    } while (expressions.acceptListComma());
    end();
    return values;
  }
}
