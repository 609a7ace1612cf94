package whorl.jupyter;

/** The five ways that messages go between a front end and a kernel. */
enum Channel {
  /** Requests, one after the other. */
  SHELL("shell_port"),
  /** Requests that are served while a cell runs. */
  CONTROL("control_port"),
  /** Questions to the user. */
  STDIN("stdin_port"),
  /** What all front ends see. */
  IOPUB("iopub_port"),
  /** Whether the kernel is there. */
  HEARTBEAT("hb_port");

  private final String portName;

  Channel(String portName) {
    this.portName = portName;
  }

  /** What a connection file calls its port. */
  String portName() {
    return portName;
  }
}
