package whorl.syntax;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Predicate;
import whorl.diagnostic.Diagnostic;
import whorl.diagnostic.Source;
import whorl.diagnostic.Span;
import whorl.syntax.Token.Kind;

/**
 * Reads a text of the sheet language. It never fails: what cannot be read is reported, and reading
 * goes on at the next statement.
 */
public final class Parser {
  /** No more mistakes than this are reported for one text. */
  public static final int MOST_ERRORS = 10;

  /** A text longer than this, in code points, is refused as a whole. */
  public static final int LONGEST_TEXT = 1_000_000;

  /** A text of more statements than this is refused as a whole. */
  public static final int MOST_STATEMENTS = 10_000;

  private Parser() {}

  /**
   * Reads a text.
   *
   * @param names whether the sheet has a name, in folded spelling; the names that the text itself
   *     defines are added here
   * @param units what is known of units
   */
  public static Parsed parse(Source source, Predicate<String> names, UnitWords units) {
    var messages = new SyntaxMessages(source);
    if (source.length() > LONGEST_TEXT) {
      return refused(messages.textTooLong(LONGEST_TEXT));
    }
    LineSplitter.Split split = LineSplitter.split(Lexer.tokens(source, messages));
    Optional<LogicalLine> tooMany =
        split.lines().stream().filter(line -> !line.isIndented()).skip(MOST_STATEMENTS).findFirst();
    if (tooMany.isPresent()) {
      return refused(messages.tooManyStatements(tooMany.get().span(), MOST_STATEMENTS));
    }
    Set<String> own = namesDefinedIn(split.lines());
    var errors = new ArrayList<Diagnostic>();
    var unitWords = new ArrayList<UnitWord>();
    var reading =
        new Reading(
            messages, name -> own.contains(name) || names.test(name), units, unitWords, errors);
    List<Statement> statements = statements(split.lines(), reading);
    var reported = errors.subList(0, Math.min(errors.size(), MOST_ERRORS));
    return new Parsed(statements, split.remarks(), reported, unitWords);
  }

  private static Parsed refused(Diagnostic diagnostic) {
    return new Parsed(List.of(), List.of(), List.of(diagnostic), List.of());
  }

  /**
   * Reads heads of functions that are worked out outside the sheet, one a line.
   *
   * @param names as for a text of the sheet
   * @param units what is known of units
   */
  public static Parsed heads(Source source, Predicate<String> names, UnitWords units) {
    var messages = new SyntaxMessages(source);
    if (source.length() > LONGEST_TEXT) {
      return refused(messages.textTooLong(LONGEST_TEXT));
    }
    var statements = new ArrayList<Statement>();
    var errors = new ArrayList<Diagnostic>();
    var reading = new Reading(messages, names, units, new ArrayList<>(), errors);
    for (List<Token> line : lines(Lexer.tokens(source, messages))) {
      try {
        statements.add(head(line, reading));
      } catch (Refusal refusal) {
        errors.add(refusal.diagnostic());
      }
    }
    var reported = errors.subList(0, Math.min(errors.size(), MOST_ERRORS));
    return new Parsed(statements, List.of(), reported, reading.unitWords());
  }

  /** The tokens of each line, with the end of the line behind them. */
  private static List<List<Token>> lines(List<Token> tokens) {
    var lines = new ArrayList<List<Token>>();
    int start = 0;
    for (int i = 0; i < tokens.size(); i++) {
      if (tokens.get(i).is(Kind.LINE_END)) {
        lines.add(tokens.subList(start, i + 1));
        start = i + 1;
      }
    }
    return lines;
  }

  private static Statement head(List<Token> line, Reading reading) {
    var tokens = new ArrayList<>(line);
    Token end = tokens.remove(tokens.size() - 1);
    String remark = "";
    if (!tokens.isEmpty() && tokens.get(tokens.size() - 1).is(Kind.REMARK)) {
      remark = tokens.remove(tokens.size() - 1).text();
    }
    if (tokens.isEmpty()) {
      throw new Refusal(reading.messages().headEmpty(end.span()));
    }
    Span behind = tokens.get(tokens.size() - 1).span().behind();
    tokens.add(new Token(Kind.END, behind, "", false, null));
    return StatementParser.head(new LogicalLine(tokens, new Span(0, 0), remark), reading);
  }

  private static List<Statement> statements(List<LogicalLine> lines, Reading reading) {
    var statements = new ArrayList<Statement>();
    int next = 0;
    while (next < lines.size() && reading.errors().size() < MOST_ERRORS) {
      LogicalLine line = lines.get(next++);
      int end = next;
      while (end < lines.size() && lines.get(end).isIndented()) {
        end++;
      }
      List<LogicalLine> block = lines.subList(next, end);
      next = end;
      int before = reading.errors().size();
      try {
        if (line.isIndented()) {
          throw new Refusal(Blocks.unexpected(line, reading.messages()));
        }
        Statement statement = StatementParser.statement(line, block, reading);
        if (reading.errors().size() == before) {
          statements.add(statement);
        }
      } catch (Refusal refusal) {
        reading.errors().add(refusal.diagnostic());
      }
    }
    return statements;
  }

  /** The names that the statements of a text define, in folded spelling. */
  private static Set<String> namesDefinedIn(List<LogicalLine> lines) {
    var names = new HashSet<String>();
    for (LogicalLine line : lines) {
      Token first = line.first();
      if (line.isIndented() || !first.is(Kind.NAME)) {
        continue;
      }
      if (first.isWord("cases")) {
        names.addAll(Shapes.columnNames(line.tokens()));
      } else if (!first.isReservedWord() && Shapes.defines(line.tokens())) {
        names.add(first.name().name());
      }
    }
    return names;
  }
}
