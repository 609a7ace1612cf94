package whorl.jupyter;

import java.nio.charset.StandardCharsets;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Deque;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.concurrent.TimeUnit;
import org.zeromq.SocketType;
import org.zeromq.ZContext;
import org.zeromq.ZMQ;
import org.zeromq.ZMQ.Poller;
import org.zeromq.ZMQ.Socket;
import org.zeromq.ZMQException;

/**
 * The sockets. One thread of their own does nothing but take messages from one place to another, so
 * that whatever runs elsewhere, requests are received and heartbeats returned.
 */
final class Sockets implements Runnable, Outbox.Carrier {
  /** Is told what arrives. */
  interface Receiver {
    /** On shell, control or stdin. */
    void received(Channel channel, List<byte[]> frames);

    /** Messages to a front end that wants to hear of a topic from now on. */
    List<List<byte[]>> welcome(byte[] topic);
  }

  private static final List<Channel> REQUESTS =
      List.of(Channel.CONTROL, Channel.SHELL, Channel.STDIN);

  /** With this a subscription begins, and its end with another. */
  private static final byte SUBSCRIBE = 1;

  private static final String OUTGOING = "inproc://outgoing";
  private static final String END = "END";

  /** A frame that claims to be longer is not waited for. */
  private static final long LONGEST_FRAME = 256L << 20;

  /** How long replies have to leave when the sockets are closed, in milliseconds. */
  private static final int LINGER = 1_000;

  /** For each front end so many outputs wait here; beyond, they wait where they arise. */
  private static final int MOST_OUTPUTS = 1_000;

  private static final int MOST_OUTGOING = 100;

  /** How long a message waits for room before others have their turn, in milliseconds. */
  private static final int TURN = 5;

  /** A front end that takes nothing for so long holds the others up no more: it misses outputs. */
  private static final long PATIENCE = TimeUnit.SECONDS.toNanos(2);

  private final ZContext context = new ZContext(1);
  private final Map<Channel, Socket> sockets = new EnumMap<>(Channel.class);
  private final Socket outgoing;
  private final Socket toOutgoing;
  private final Receiver receiver;
  private final Log log;

  /** What is to be published, in order; nearly always nothing, for nearly always there is room. */
  private final Deque<List<byte[]>> unpublished = new ArrayDeque<>();

  private long lastPublished;
  private boolean ended;

  /** Binds the sockets. */
  Sockets(
      ConnectionFile connection, Receiver receiver, Thread.UncaughtExceptionHandler fatal, Log log)
      throws KernelException {
    this.receiver = receiver;
    this.log = log;
    context.setUncaughtExceptionHandler(fatal);
    context.setNotificationExceptionHandler((thread, e) -> log.line("trouble with a socket", e));
    for (Channel channel : Channel.values()) {
      sockets.put(channel, bound(channel, connection));
    }
    outgoing = context.createSocket(SocketType.PULL);
    outgoing.setRcvHWM(MOST_OUTGOING);
    outgoing.bind(OUTGOING);
    toOutgoing = context.createSocket(SocketType.PUSH);
    toOutgoing.connect(OUTGOING);
  }

  private Socket bound(Channel channel, ConnectionFile connection) throws KernelException {
    Socket socket =
        context.createSocket(channel == Channel.IOPUB ? SocketType.XPUB : SocketType.ROUTER);
    socket.setLinger(LINGER);
    socket.setMaxMsgSize(LONGEST_FRAME);
    socket.setIPv6(connection.isVersion6());
    if (channel == Channel.IOPUB) {
      socket.setXpubVerbose(true);
      socket.setXpubNoDrop(true);
      socket.setSndHWM(MOST_OUTPUTS);
      socket.setSendTimeOut(TURN);
    } else {
      socket.setRouterHandover(true);
      socket.setHWM(0);
    }
    String address = connection.address(channel);
    try {
      socket.bind(address);
    } catch (ZMQException | IllegalArgumentException e) {
      context.close();
      throw new KernelException(
          String.format(
              "cannot listen at %s (%s): another program does, or the address is not one of this"
                  + " machine's",
              address, channel.portName()),
          e);
    }
    return socket;
  }

  /** Hands a message to the thread of the sockets, from one thread only; none ends it. */
  @Override
  public void carry(Channel channel, List<byte[]> frames) {
    toOutgoing.sendMore(channel.name());
    isSent(toOutgoing, frames);
  }

  /** Ends the thread of the sockets, from the thread that hands messages to it. */
  void end() {
    toOutgoing.send(END);
  }

  @Override
  public void run() {
    Poller poller = context.createPoller(sockets.size() + 1);
    poller.register(outgoing, Poller.POLLIN);
    sockets.values().forEach(socket -> poller.register(socket, Poller.POLLIN));
    while (!ended) {
      if (poller.poll(unpublished.isEmpty() ? -1 : 0) < 0) {
        throw new IllegalStateException("the sockets cannot be watched");
      }
      for (Channel channel : REQUESTS) {
        takeIn(channel);
      }
      returnHeartbeat();
      welcome(received(socket(Channel.IOPUB)));
      if (unpublished.isEmpty()) {
        sendOut(received(outgoing));
      }
      publish();
    }
    context.close();
  }

  private void takeIn(Channel channel) {
    List<byte[]> frames = received(socket(channel));
    if (frames.isEmpty()) {
      return;
    }
    try {
      receiver.received(channel, frames);
    } catch (Throwable e) {
      log.line("a message on " + channel.portName() + " could not be taken in", e);
    }
  }

  private void returnHeartbeat() {
    Socket heart = socket(Channel.HEARTBEAT);
    List<byte[]> beat = received(heart);
    if (!beat.isEmpty()) {
      isSent(heart, beat);
    }
  }

  private void welcome(List<byte[]> wish) {
    if (!wish.isEmpty() && wish.get(0).length > 0 && wish.get(0)[0] == SUBSCRIBE) {
      byte[] subscription = wish.get(0);
      byte[] topic = Arrays.copyOfRange(subscription, 1, subscription.length);
      unpublished.addAll(receiver.welcome(topic));
    }
  }

  private void sendOut(List<byte[]> outgoing) {
    if (outgoing.isEmpty()) {
      return;
    }
    String address = new String(outgoing.get(0), StandardCharsets.UTF_8);
    List<byte[]> frames = outgoing.subList(1, outgoing.size());
    if (address.equals(END)) {
      ended = true;
    } else if (address.equals(Channel.IOPUB.name())) {
      unpublished.add(frames);
    } else {
      isSent(socket(Channel.valueOf(address)), frames);
    }
  }

  private void publish() {
    Socket iopub = socket(Channel.IOPUB);
    while (!unpublished.isEmpty()) {
      List<byte[]> frames = unpublished.element();
      if (!isSent(iopub, frames)) {
        if (System.nanoTime() - lastPublished < PATIENCE) {
          return;
        }
        iopub.setXpubNoDrop(false);
        isSent(iopub, frames);
        iopub.setXpubNoDrop(true);
      }
      unpublished.remove();
      lastPublished = System.nanoTime();
    }
  }

  private Socket socket(Channel channel) {
    return Objects.requireNonNull(sockets.get(channel));
  }

  /** Whether there was room for a message; if there is for its first part, there is for all. */
  private static boolean isSent(Socket socket, List<byte[]> frames) {
    int last = frames.size() - 1;
    for (int i = 0; i < last; i++) {
      if (!socket.send(frames.get(i), ZMQ.SNDMORE)) {
        return false;
      }
    }
    return socket.send(frames.get(last), 0);
  }

  /** A message that has arrived, or nothing. */
  private static List<byte[]> received(Socket socket) {
    var frames = new ArrayList<byte[]>();
    byte[] frame = socket.recv(ZMQ.DONTWAIT);
    while (frame != null) {
      frames.add(frame);
      frame = socket.hasReceiveMore() ? socket.recv() : null;
    }
    return frames;
  }
}
