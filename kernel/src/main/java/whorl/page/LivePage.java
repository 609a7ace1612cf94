package whorl.page;

import com.google.gson.JsonObject;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.UUID;
import whorl.assist.Assistant;
import whorl.assist.Completeness;
import whorl.assist.Completion;
import whorl.diagnostic.Source;
import whorl.java.JavaOutcome;
import whorl.java.JavaSide;
import whorl.java.SheetReading;
import whorl.report.CellReport;
import whorl.report.DefinitionList;
import whorl.report.ErrorText;
import whorl.sheet.CellId;
import whorl.sheet.CellOutcome;
import whorl.sheet.Progress;
import whorl.sheet.PublishedFunction;
import whorl.sheet.Sheet;
import whorl.sheet.Step;
import whorl.syntax.CatalogueWords;
import whorl.syntax.Parser;
import whorl.syntax.Statement;

/** A page with one sheet and, beside it, Java. */
public final class LivePage implements Page {
  private final PlainLanguage language;
  private final Sheet sheet = new Sheet();
  private final JavaReads reads = new JavaReads();
  private final LiveSheet live = new LiveSheet(sheet, reads);
  private final JavaSide java = new JavaSide(SheetReading.of(sheet));
  private final Assistant assistant = new Assistant(sheet, words());
  private final Interruption interruption = new Interruption();

  /** Inputs of a console bear no ids; those of the next kernel must not be taken for them. */
  private final String console = UUID.randomUUID().toString();

  private long inputs;

  /** An empty page. */
  public LivePage(PlainLanguage language) {
    this.language = language;
  }

  /** The words that may begin a cell, for completion. */
  private static List<Completion.Candidate> words() {
    var words = new ArrayList<Completion.Candidate>();
    words.add(new Completion.Candidate(CellText.JAVA, "magic", "the cell is in Java"));
    words.add(new Completion.Candidate(CellText.SHEET, "magic", "the cell is of the sheet"));
    for (Command.Word word : Command.Word.values()) {
      words.add(new Completion.Candidate(word.text(), "magic", word.effect()));
    }
    return words;
  }

  @Override
  public PlainLanguage language() {
    return language;
  }

  @Override
  public CellAnswer run(CellRequest request, Front front) {
    String id = request.cell().orElseGet(() -> console + "-" + ++inputs);
    var turn = new Turn(request, new CellId(id), front);
    CellText text = CellText.of(request.code(), language);
    live.withdrawDeleted(turn);
    interruption.begin();
    try {
      if (text.language() == PlainLanguage.JAVA) {
        return java(turn, text.body());
      }
      reads.forget(turn.cell());
      return Command.begins(text.body()) ? commands(turn, text.body()) : sheet(turn, text.body());
    } finally {
      interruption.over();
    }
  }

  private CellAnswer sheet(Turn turn, String text) {
    var progress = new ProgressBar(turn.front(), turn.cell().id() + "/progress");
    sheet.onProgress(progress);
    CellOutcome outcome =
        turn.isOnPage()
            ? sheet.run(turn.cell(), turn.label(), text)
            : sheet.runFromConsole(turn.cell(), turn.label(), text);
    sheet.onProgress(Progress.UNWATCHED);
    progress.end();
    return live.settle(turn, outcome);
  }

  private CellAnswer commands(Turn turn, String text) {
    // A cell that held definitions before is a cell of commands now.
    turn.made(sheet.withdraw(turn.cell()));
    Optional<CellAnswer> fault = Optional.empty();
    try {
      for (Command command : Command.read(text)) {
        fault = fault.or(() -> carriedOut(command, turn));
      }
    } catch (IllegalArgumentException e) {
      String problem = String.valueOf(e.getMessage());
      fault = Optional.of(new CellAnswer.Failed(ErrorText.NAME, problem, List.of(problem)));
    }
    live.settle(turn);
    return fault.orElseGet(CellAnswer.Done::new);
  }

  /** Does what a command says; what is wrong with it, if anything is. */
  private Optional<CellAnswer> carriedOut(Command command, Turn turn) {
    switch (command.word()) {
      case DEFINITIONS -> {
        DefinitionList list = DefinitionList.of(sheet.definitions());
        turn.front().display(bundle(list.html(), list.text()), null);
      }
      case RESULTS -> live.showAll(turn.front());
      case WITHDRAW -> {
        for (String name : command.names()) {
          CellOutcome outcome = sheet.withdraw(name);
          if (!outcome.tookEffect()) {
            return Optional.of(LiveSheet.refused(outcome));
          }
          turn.made(outcome);
          turn.say(outcome.notices().get(0).problem());
        }
      }
    }
    return Optional.empty();
  }

  private CellAnswer java(Turn turn, String text) {
    JavaOutcome outcome = java.run(turn.label(), text, new FrontOutput(turn.front()));
    if (outcome instanceof JavaOutcome.Done done) {
      reads.note(turn.cell(), turn.label(), done.reads());
      return live.settle(turn, published(turn, done.functions()));
    }
    live.settle(turn);
    if (outcome instanceof JavaOutcome.Failed failed) {
      reads.note(turn.cell(), turn.label(), failed.reads());
      return new CellAnswer.Failed(failed.name(), failed.summary(), failed.lines());
    }
    String notice = ((JavaOutcome.Interrupted) outcome).notice();
    String summary = "The cell was interrupted.";
    return new CellAnswer.Failed(
        CellAnswer.INTERRUPTED, summary, List.of(notice.isEmpty() ? summary : notice));
  }

  private CellOutcome published(Turn turn, List<PublishedFunction> functions) {
    return turn.isOnPage()
        ? sheet.publish(turn.cell(), turn.label(), functions)
        : sheet.publishFromConsole(turn.cell(), turn.label(), functions);
  }

  @Override
  public ExpressionAnswer evaluate(String expression) {
    interruption.begin();
    try {
      return language == PlainLanguage.JAVA ? java(expression) : shown(expression);
    } finally {
      interruption.over();
    }
  }

  private ExpressionAnswer java(String expression) {
    var value = new ValueOnly();
    JavaOutcome outcome = java.run("expression", expression, new FrontOutput(value));
    if (outcome instanceof JavaOutcome.Failed failed) {
      return new ExpressionAnswer.Failed(failed.name(), failed.summary(), failed.lines());
    }
    return value
        .value()
        .<ExpressionAnswer>map(ExpressionAnswer.Value::new)
        .orElseGet(
            () -> {
              String problem = "The expression gave no value.";
              return new ExpressionAnswer.Failed(CellAnswer.NO_VALUE, problem, List.of(problem));
            });
  }

  private ExpressionAnswer shown(String expression) {
    var cell = new CellId(console + "-expression");
    var source = new Source(expression);
    List<Statement> statements =
        Parser.parse(source, name -> false, CatalogueWords.STANDARD).statements();
    if (!statements.stream().allMatch(Statement.Show.class::isInstance)) {
      String problem = "An expression is expected here, not a statement.";
      return new ExpressionAnswer.Failed(ErrorText.NAME, problem, List.of(problem));
    }
    CellOutcome outcome = sheet.run(cell, "expression", expression);
    sheet.withdraw(cell);
    var errors = new ArrayList<>(outcome.errors());
    for (Step step : outcome.steps()) {
      if (step instanceof Step.Waiting waiting) {
        waiting.undefined(Set.of()).ifPresent(errors::add);
      }
    }
    if (!errors.isEmpty()) {
      ErrorText error = ErrorText.of(errors, outcome.source());
      return new ExpressionAnswer.Failed(ErrorText.NAME, error.summary(), error.lines());
    }
    return new ExpressionAnswer.Value(SheetBundle.of(CellReport.of(outcome)));
  }

  @Override
  public Optional<Bundle> inspect(String code, int cursor, int detail) {
    CellText text = CellText.of(code, language);
    if (!text.holds(cursor)) {
      return Optional.empty();
    }
    int place = cursor - text.offset();
    return text.language() == PlainLanguage.JAVA
        ? java.inspect(text.body(), place).map(Bundle::of)
        : assistant
            .inspect(text.body(), place, detail)
            .map(card -> bundle(card.html(), card.text()));
  }

  private static Bundle bundle(String html, String text) {
    var data = new JsonObject();
    data.addProperty("text/html", html);
    data.addProperty("text/plain", text);
    return Bundle.of(data);
  }

  @Override
  public Completion complete(String code, int cursor) {
    CellText text = CellText.of(code, language);
    if (!text.holds(cursor)) {
      return Completion.none(cursor);
    }
    int place = cursor - text.offset();
    Completion completion =
        text.language() == PlainLanguage.JAVA
            ? java.complete(text.body(), place)
            : assistant.complete(text.body(), place);
    return completion.movedBy(text.offset());
  }

  @Override
  public Completeness completeness(String code) {
    CellText text = CellText.of(code, language);
    return text.language() == PlainLanguage.JAVA
        ? java.completeness(text.body())
        : Assistant.completeness(text.body());
  }

  @Override
  public void interrupt() {
    interruption.interrupt();
  }

  @Override
  public void close() {
    java.close();
  }
}
