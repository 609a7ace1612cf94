package whorl.notebook;

import whorl.sheet.Step;

/** What a step counts as when a note is summed up. */
public enum Mark {
  /** A definition with a value. */
  RESULT,
  /** A check that holds. */
  CHECK_HOLDS,
  /** A check that fails. */
  CHECK_FAILS,
  /** An assumption that holds. */
  ASSUMPTION_HOLDS,
  /** An assumption that fails. */
  ASSUMPTION_FAILS,
  /** Neither a result nor a verdict; what is wrong is counted among the errors. */
  NONE;

  /** Whether the argument of the note does not stand because of it. */
  public boolean isFailure() {
    return this == CHECK_FAILS || this == ASSUMPTION_FAILS;
  }

  /** The mark of a step. */
  public static Mark of(Step step) {
    return step.match(
        new Step.Cases<>() {
          @Override
          public Mark defined(Step.Defined defined) {
            return RESULT;
          }

          @Override
          public Mark function(Step.Function function) {
            return NONE;
          }

          @Override
          public Mark published(Step.Published published) {
            return NONE;
          }

          @Override
          public Mark shown(Step.Shown shown) {
            return NONE;
          }

          @Override
          public Mark checked(Step.Checked checked) {
            return checked.verdict().holds() ? CHECK_HOLDS : CHECK_FAILS;
          }

          @Override
          public Mark reproduced(Step.Reproduced reproduced) {
            return reproduced.holds() ? CHECK_HOLDS : CHECK_FAILS;
          }

          @Override
          public Mark assumed(Step.Assumed assumed) {
            return assumed.verdict().holds() ? ASSUMPTION_HOLDS : ASSUMPTION_FAILS;
          }

          @Override
          public Mark followed(Step.Ran ran) {
            return RESULT;
          }

          @Override
          public Mark sketched(Step.Sketched sketched) {
            return NONE;
          }

          @Override
          public Mark waiting(Step.Waiting waiting) {
            return NONE;
          }

          @Override
          public Mark broken(Step.Broken broken) {
            return NONE;
          }
        });
  }
}
