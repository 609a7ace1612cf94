package whorl.assist;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import whorl.check.Meaning;
import whorl.syntax.Token;
import whorl.syntax.Token.Kind;
import whorl.units.UnitText;

/**
 * A statement with a gap for a unit. Which units may stand in the gap is for the checker of the
 * language to say, so that no rule about kinds is told twice.
 *
 * @param before what stands in front of the gap
 * @param after what stands behind it
 * @param binding whether a unit that does not fit would be wrong, however the line goes on
 */
record Trial(String before, String after, boolean binding) {
  /** The statement with a unit in the gap. */
  String with(UnitText unit) {
    return before + (before.endsWith("[") ? unit : tight(unit)).plain() + after;
  }

  /** A unit as it is written behind a number, where none begins with {@code 1/}. */
  static UnitText tight(UnitText unit) {
    return unit.over().isEmpty() ? new UnitText(unit.members(), List.of()) : unit;
  }

  /** Statements that a line with a unit in brackets may become, the likeliest first. */
  static List<Trial> inBrackets(AtCursor at, int open, DraftSheet draft) {
    List<Token> tokens = at.tokens();
    String before = at.between(at.lineStart(), tokens.get(open).span().end());
    int end = at.index() + 1;
    while (UnitSpan.isOfUnit(tokens.get(end))) {
      end++;
    }
    Token behind = tokens.get(end);
    boolean closed = behind.is(Kind.CLOSE_BRACKET) || behind.is(Kind.COMMA);
    String after =
        closed
            ? at.between(behind.span().start(), at.lineEnd())
            : "]" + at.between(at.word().span().end(), at.lineEnd());
    boolean more = !after.equals("]");
    var trials = new ArrayList<Trial>();
    // A name with a bracket behind it and nothing more may yet become a definition of another kind.
    trials.add(new Trial(before, after, more || open > 1));
    if (more) {
      trials.add(new Trial(before, "]" + new Closing(at, open, draft).text(), false));
    }
    return trials;
  }

  /** Statements that a line with a unit behind a number may become, the likeliest first. */
  static List<Trial> behindNumber(AtCursor at, int holder, DraftSheet draft) {
    int end = at.tokens().get(holder).span().end();
    String before = at.between(at.lineStart(), end) + " ";
    String after = at.between(at.word().span().end(), at.lineEnd());
    var trials = new ArrayList<Trial>();
    trials.add(new Trial(before, after, false));
    trials.add(new Trial(before, new Closing(at, holder, draft).text(), false));
    new Piece(at, holder).trial().ifPresent(trials::add);
    at.line()
        .defines()
        .filter(name -> !at.line().definesFunction())
        .ifPresent(name -> trials.add(new Trial(name.name() + " [", "]", false)));
    return trials;
  }

  /** What a line lacks behind one of its tokens to be a statement. */
  private record Closing(AtCursor at, int last, DraftSheet draft) {
    String text() {
      List<Token> tokens = at.tokens();
      var open = new ArrayList<Integer>();
      for (int i = 0; i <= last; i++) {
        if (tokens.get(i).is(Kind.OPEN)) {
          open.add(i);
        } else if (tokens.get(i).is(Kind.CLOSE) && !open.isEmpty()) {
          open.remove(open.size() - 1);
        }
      }
      var text = new StringBuilder();
      for (int i = open.size() - 1; i >= 0; i--) {
        text.append(missingArguments(open.get(i))).append(')');
      }
      boolean comparesStated =
          tokens.get(0).isWord("check") && has(Kind.EQUALS) && !hasWord("within");
      return text + (comparesStated ? " within 1 %" : "");
    }

    private boolean has(Kind kind) {
      return at.tokens().subList(0, last).stream().anyMatch(token -> token.is(kind));
    }

    private boolean hasWord(String word) {
      return at.tokens().subList(0, last).stream().anyMatch(token -> token.isWord(word));
    }

    /** The arguments that a call of a function of the sheet still lacks. */
    private String missingArguments(int open) {
      List<Token> tokens = at.tokens();
      if (open == 0
          || !tokens.get(open - 1).isFreeName()
          || !tokens.get(open - 1).touches(tokens.get(open))
          || !(draft.meaning(tokens.get(open - 1).name().name()).orElse(null)
              instanceof Meaning.Function function)) {
        return "";
      }
      int given = 1;
      int depth = 0;
      for (int i = open + 1; i <= last; i++) {
        Kind kind = tokens.get(i).kind();
        depth += kind == Kind.OPEN ? 1 : kind == Kind.CLOSE ? -1 : 0;
        given += kind == Kind.COMMA && depth == 0 ? 1 : 0;
      }
      var missing = new StringBuilder();
      for (Meaning.Parameter parameter :
          function
              .parameters()
              .subList(
                  Math.min(given, function.parameters().size()), function.parameters().size())) {
        missing.append(", ").append(draft.standIn(parameter.readings(), parameter.unit()));
      }
      return missing.toString();
    }
  }

  /** The sum or comparison that a number stands in, apart from what is around it. */
  private record Piece(AtCursor at, int holder) {
    /** The piece as a statement; empty for a number alone, with which any unit goes. */
    Optional<Trial> trial() {
      List<Token> tokens = at.tokens();
      int start = holder;
      int depth = 0;
      boolean compares = false;
      while (start > 0) {
        Token token = tokens.get(start - 1);
        Kind kind = token.kind();
        if (kind == Kind.CLOSE || kind == Kind.CLOSE_BRACKET) {
          depth++;
        } else if (kind == Kind.OPEN || kind == Kind.OPEN_BRACKET) {
          depth--;
        }
        boolean delimits =
            depth < 0
                || (depth == 0
                    && (kind == Kind.COMMA
                        || kind == Kind.EQUALS
                        || kind == Kind.COLON
                        || token.isReservedWord()
                        || token.isWord("within")));
        if (delimits) {
          break;
        }
        compares |= depth == 0 && kind.isRelation();
        start--;
      }
      String text =
          at.between(tokens.get(start).span().start(), tokens.get(holder).span().end()) + " ";
      if (compares) {
        return Optional.of(new Trial("check " + text, "", false));
      }
      boolean branch =
          depth == 0
              && start > 0
              && (tokens.get(start - 1).isWord("then") || tokens.get(start - 1).isWord("else"));
      return branch || start < holder
          ? Optional.of(new Trial((branch ? head() : "") + "(" + text, ")", false))
          : Optional.empty();
    }

    /** The line up to its right side, if it defines something. */
    private String head() {
      for (Token token : at.tokens().subList(0, holder)) {
        if (token.is(Kind.EQUALS)) {
          return at.line().defines().isPresent()
              ? at.between(at.lineStart(), token.span().end()) + " "
              : "";
        }
      }
      return "";
    }
  }
}
