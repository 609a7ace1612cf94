package whorl.report;

/**
 * How steps look in HTML, all in one place. Only inline styles: they are all that an untrusted page
 * keeps, and it keeps no theme variables. So every line and word reads without colour, text takes
 * the colour of the page, and where a variable adds a colour the declaration in front of it stands
 * by itself.
 */
final class Look {
  private static final String HAIRLINE = "1px solid rgba(128,128,128,0.4)";
  private static final String ALARM =
      "color:var(--jp-error-color1, var(--vscode-errorForeground, inherit))";
  private static final String MATH =
      "font-family:'STIX Two Text','Cambria','Libertinus Serif','Times New Roman',"
          + "'Liberation Serif',serif;";

  static final String SCROLL = "overflow-x:auto;margin:0 0 6px 0";
  // Notebook pages centre tables, stripe their rows and set the text of cells to the right.
  static final String TABLE =
      "border-collapse:collapse;width:100%;min-width:40em;margin:0;table-layout:auto;"
          + "font-size:100%;line-height:1.4;border-top:2px solid;border-bottom:2px solid";
  static final String HEAD_ROW = "background:transparent;border-bottom:1px solid";
  static final String ROW =
      "background:transparent;border-top:" + HAIRLINE + ";page-break-inside:avoid";
  static final String ROW_BELOW = "background:transparent;page-break-inside:avoid";

  private static final String CELL =
      "text-align:left;vertical-align:baseline;line-height:1.4;font-weight:normal;";
  static final String HEAD = CELL + "padding:3px 10px 3px 8px;font-size:82%;letter-spacing:0.06em";
  static final String QUANTITY = CELL + "padding:5px 10px 5px 8px;white-space:nowrap;";
  static final String RULE = CELL + "padding:5px 10px 5px 8px";
  static final String WITH = CELL + "padding:5px 10px 5px 8px;white-space:nowrap";
  static final String SIGN = CELL + "padding:5px 5px 5px 8px;width:1%;white-space:nowrap;" + MATH;
  static final String NUMBER =
      "text-align:right;vertical-align:baseline;line-height:1.4;padding:5px 0;width:1%;"
          + "white-space:nowrap;"
          + MATH;
  static final String UNIT = CELL + "padding:5px 10px 5px 0;white-space:nowrap;" + MATH;
  static final String GIVES = CELL + "padding:5px 10px 5px 8px;min-width:11em;white-space:normal";
  static final String GIVES_BELOW = CELL + "padding:0 10px 5px 8px;white-space:nowrap";
  static final String WHY = CELL + "padding:5px 4px 5px 10px;min-width:9em;border-left:" + HAIRLINE;
  static final String CARD = CELL + "padding:2px 8px 8px 14px;white-space:normal";

  static final String SNUG_TABLE = "border-collapse:collapse;margin:2px 0 4px 0;font-size:100%";
  static final String PLAIN_ROW = "background:transparent";
  static final String SNUG = CELL + "padding:1px 18px 1px 0";

  static final String GRID_HEAD =
      "text-align:right;vertical-align:baseline;line-height:1.4;font-weight:normal;"
          + "padding:1px 0 1px 22px;white-space:nowrap";
  static final String GRID_NUMBER = GRID_HEAD + ";" + MATH;

  static final String LINE = "display:block";
  static final String NOTE = "margin:4px 0 0 0;font-size:92%";
  static final String HEADING = "margin:6px 0 2px 0;font-size:92%;letter-spacing:0.04em";
  static final String CAPTION = "margin:2px 0 0 0;font-size:85%;opacity:0.75";
  static final String QUIET = "opacity:0.75";
  static final String BOLD = "font-weight:bold";
  static final String FORMULA = MATH + "font-size:108%";
  static final String EXCERPT =
      "font-family:monospace;font-size:92%;line-height:1.35;white-space:pre;overflow-x:auto;"
          + "margin:6px 0;padding:0;border:none;background:transparent";
  static final String ADVICE = "white-space:pre-line";
  static final String CARD_ALONE =
      "border-left:4px double rgba(200,50,50,0.95);padding:2px 0 4px 10px;margin:0 0 8px 0";
  static final String PROBLEM = "font-weight:bold;white-space:normal";

  static final String INFO = "margin:0 0 6px 0;line-height:1.4";
  static final String INFO_TITLE =
      "font-family:monospace;font-size:100%;font-weight:bold;white-space:pre-wrap";
  static final String INFO_LEAD = "margin:2px 0 0 0";
  static final String INFO_TABLE =
      "border-collapse:collapse;margin:6px 0 0 0;font-size:100%;line-height:1.4;border:none;"
          + "color:inherit";
  static final String INFO_ROW = "background:transparent";
  static final String INFO_WORD = CELL + "padding:1px 12px 1px 0;white-space:nowrap";
  static final String INFO_FACT = CELL + "padding:1px 0;white-space:pre-wrap";

  static final String ITALIC = "font-style:italic";
  static final String BOLD_ITALIC = "font-style:italic;font-weight:bold";
  static final String UPRIGHT = "font-style:normal";
  static final String UNBROKEN = "white-space:nowrap";

  /** A number keeps its sign and its unit beside it. */
  static final String VALUE = FORMULA + ";" + UNBROKEN;

  static final String TERM = "display:inline-block;text-indent:0";
  static final String RAISED = "font-size:72%;line-height:0;vertical-align:0.5em";
  static final String LOWERED = "font-size:72%;line-height:0;vertical-align:-0.28em";
  static final String SCRIPTS =
      "display:inline-block;font-size:72%;line-height:1.05;vertical-align:-0.36em;text-align:left";
  static final String SCRIPT = "display:block;font-size:100%;line-height:1.05;position:static";
  static final String FRACTION =
      "display:inline-block;vertical-align:middle;text-align:center;margin:0 0.12em;"
          + "white-space:nowrap;line-height:1.3";
  static final String OVER = "display:block;padding:0 0.25em";
  static final String UNDER = "display:block;padding:0 0.25em;border-top:1px solid";
  static final String SMALL_FRACTION = "font-size:112%;line-height:1";

  /** Present for whoever copies the text or reads it aloud; the bar says it to the eye. */
  static final String UNSEEN = "font-size:0";

  static final String ROOT = "font-size:122%;line-height:0;vertical-align:-0.05em";
  static final String RADICAND =
      "border-top:1px solid;padding:0.16em 0.15em 0 0.1em;margin-left:-0.04em";
  static final String BARS =
      "display:inline-block;border-left:1px solid;border-right:1px solid;padding:0 0.2em;"
          + "margin:0 0.1em;line-height:1.2";
  static final String BRANCHES =
      "display:inline-block;vertical-align:middle;border-left:1px solid;padding-left:0.5em";
  static final String CONDITION = "padding-left:1em";

  private Look() {}

  /**
   * The head of a column, with its share of the width.
   *
   * @param nothingWentIn whether no row has anything in “with”, as in a table of inputs, so that
   *     the remarks can have its room
   */
  static String head(String word, boolean nothingWentIn) {
    return switch (word) {
      case "quantity" -> HEAD + ";width:8%;border-left:4px solid transparent";
      case "rule" -> HEAD + ";width:" + (nothingWentIn ? "16%" : "25%");
      case "with" -> HEAD + ";width:" + (nothingWentIn ? "6%" : "24%");
      case "gives" -> HEAD + ";width:19%";
      default -> HEAD + ";width:" + (nothingWentIn ? "51%" : "24%") + ";border-left:" + HAIRLINE;
    };
  }

  /** The rail at the left of a row, told apart by its line as well as its colour. */
  static String rail(Tone tone) {
    return switch (tone) {
      case PLAIN -> "border-left:4px solid transparent";
      case GOOD -> "border-left:4px solid rgba(46,139,87,0.8)";
      case BAD -> "border-left:4px double rgba(200,50,50,0.95)";
      case DOUBTFUL -> "border-left:4px dashed rgba(200,50,50,0.8)";
      case OPEN -> "border-left:4px dotted rgba(190,130,20,0.95)";
    };
  }

  /** A word of state. */
  static String state(Tone tone) {
    return switch (tone) {
      case PLAIN, GOOD -> BOLD;
      case BAD -> BOLD + ";" + ALARM;
      case DOUBTFUL -> "font-style:italic;" + ALARM;
      case OPEN -> BOLD + ";font-style:italic";
    };
  }
}
