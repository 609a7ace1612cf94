package whorl.mechanics.motion;

/** Why a run ended. */
public enum Ending {
  /** The condition to stop was met; the last state satisfies it. */
  STOPPED,
  /** The time given for the run was over. */
  TIME_OVER
}
