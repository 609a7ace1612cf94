package whorl.jupyter;

import java.util.Map;
import whorl.jupyter.Inbox.Arrival;

/**
 * Serves the requests of one channel, one after the other. Nothing that a request brings ends it.
 */
final class RequestLoop implements Runnable {
  private final Channel channel;
  private final Inbox inbox;
  private final Map<String, Handler> handlers;
  private final WireFormat format;
  private final Session session;
  private final Outbox outbox;
  private final Log log;

  RequestLoop(
      Channel channel,
      Inbox inbox,
      Map<String, Handler> handlers,
      WireFormat format,
      Session session,
      Outbox outbox,
      Log log) {
    this.channel = channel;
    this.inbox = inbox;
    this.handlers = Map.copyOf(handlers);
    this.format = format;
    this.session = session;
    this.outbox = outbox;
    this.log = log;
  }

  @Override
  public void run() {
    for (Arrival next = inbox.take(); !next.frames().isEmpty(); next = inbox.take()) {
      try {
        serve(next);
      } catch (BadMessageException e) {
        log.line("a message on " + channel.portName() + " was ignored: " + e.getMessage());
      } catch (Throwable e) {
        log.line("a message on " + channel.portName() + " could not be served", e);
      }
      // An interrupt that came late is not for the next request.
      Thread.interrupted();
    }
  }

  private void serve(Arrival arrival) throws BadMessageException {
    Message message = format.read(arrival.frames());
    Handler handler = handlers.get(message.type());
    if (handler == null) {
      log.line("a message of the unknown type " + message.type() + " was ignored");
      return;
    }
    var request = new Request(channel, message, arrival.aborted(), session, outbox);
    request.publishState("busy");
    try {
      handler.handle(request);
    } catch (BadContentException e) {
      String problem = message.type() + ": " + e.getMessage();
      log.line(problem);
      request.fail("BadRequest", problem);
    } catch (Throwable e) {
      log.line("a failure while serving " + message.type(), e);
      request.fail(e.getClass().getSimpleName(), "Whorl failed to answer: " + e);
    } finally {
      request.publishState("idle");
    }
  }
}
