package whorl.jupyter;

/** Serves one sort of request. */
interface Handler {
  void handle(Request request) throws BadContentException;
}
