#!/usr/bin/env python3
"""Measures the kernel as a process beside ipykernel, one after the other in the same run.

    kernel/bin/whorl lab --version                       makes the environment
    LAB=~/.cache/whorl/lab/bin/python
    $LAB -m pip install -r kernel/src/test/e2e/requirements.txt
    $LAB kernel/bench/kernel.py                          all, about two minutes
    $LAB kernel/bench/kernel.py --rounds 3               a quick look

What is measured:

start       from starting the process to the first kernel_info_reply
round trip  of one cell with one line, a unit conversion and a product, once the kernel is warm:
            from sending the request until both the reply and idle are there; in ipykernel with pint
first note  the first cell of a cold kernel: ten lines with units and a check; in ipykernel the
            same lines with pint, its import included, since a note cannot do without. Once at
            once, as a program does, and once two seconds after the start, as a person may
output      10 MB printed in lines of 63 characters, until all of it is there
archive     what the archive of classes saves of start and first note
Java        the first cell in Java, and a warm one of one line, without anything to compare with
"""

import argparse
import statistics
import time

import zmq
from jupyter_client import KernelManager

PATIENCE = 120

WHORL_LINE = "E [MJ] = 1/2 * 41.7 kg·m² * (6000 rpm)^2"
PINT_SETUP = "import pint\nu = pint.UnitRegistry()\nQ = u.Quantity"
PINT_LINE = "print((0.5 * Q(41.7, 'kg*m**2') * Q(6000, 'rpm')**2).to('MJ'))"

WHORL_NOTE = """\
m [kg] = 412   # weighed on the shop scale
D [mm] = 900   # drawing
n [rpm] = 6000
T_brake [N·m] = 350
I [kg·m²] = 1/2 * m * (D/2)^2
L [kN·m·s] = I * n
E [MJ] = 1/2 * I * n^2
t_stop [s] = L / T_brake
v [m/s] = n * D/2
check E <= 10 MJ"""
PINT_NOTE = PINT_SETUP + """
m = Q(412, 'kg')
D = Q(900, 'mm')
n = Q(6000, 'rpm')
T_brake = Q(350, 'N*m')
I = (0.5 * m * (D/2)**2).to('kg*m**2')
L = (I * n).to('kN*m*s')
E = (0.5 * I * n**2).to('MJ')
t_stop = (L / T_brake).to('s')
v = (n * D/2).to('m/s')
print(m, D, n, T_brake, I, L, E, t_stop, v, E <= Q(10, 'MJ'), sep='\\n')"""

LINES = 160_000
WHORL_OUTPUT = (
    f"%%java\nfor (int i = 0; i < {LINES}; i++) System.out.println(\"{'x' * 62}\");"
)
PYTHON_OUTPUT = f"for i in range({LINES}): print({'x' * 62!r})"


class Kernel:
    """A kernel that has just been started."""

    def __init__(self, name, without_archive=False):
        self.manager = KernelManager(kernel_name=name)
        if without_archive:
            argv = self.manager.kernel_spec.argv
            argv[:] = [word for word in argv if not word.startswith("-XX:SharedArchiveFile")]
        begin = time.perf_counter()
        self.manager.start_kernel()
        self.client = self.manager.client()
        self.client.start_channels(hb=False, stdin=False)
        self.client.kernel_info()
        self.client.get_shell_msg(timeout=PATIENCE)
        self.start = time.perf_counter() - begin
        # Until the subscription is known, what is published may be missed.
        self.client.wait_for_ready(timeout=PATIENCE)

    def __enter__(self):
        return self

    def __exit__(self, *_):
        self.client.stop_channels()
        self.manager.shutdown_kernel(now=True)

    def run(self, code):
        """Runs a cell as JupyterLab does: seconds until it is done, and characters it printed."""
        content = {"code": code, "silent": False, "store_history": True, "allow_stdin": False}
        message = self.client.session.msg("execute_request", content, metadata={"cellId": "cell"})
        request = message["header"]["msg_id"]
        begin = time.perf_counter()
        self.client.shell_channel.send(message)
        sources = (self.client.shell_channel, self.client.iopub_channel)
        poller = zmq.Poller()
        for source in sources:
            poller.register(source.socket, zmq.POLLIN)
        replied = idle = False
        printed = 0
        while not (replied and idle):
            assert poller.poll(PATIENCE * 1000), "the kernel does not answer"
            for source in sources:
                while source.msg_ready():
                    message = source.get_msg(timeout=0)
                    if message["parent_header"].get("msg_id") != request:
                        continue
                    content = message["content"]
                    assert content.get("status", "ok") == "ok", content
                    replied = replied or message["msg_type"] == "execute_reply"
                    idle = idle or content.get("execution_state") == "idle"
                    if message["msg_type"] == "stream":
                        printed += len(content["text"])
        return time.perf_counter() - begin, printed


def cold(name, note, rounds, pause=0, **options):
    """Seconds to start, and to the result of a first note: medians over some processes."""
    starts, notes = [], []
    for _ in range(rounds):
        with Kernel(name, **options) as kernel:
            starts.append(kernel.start)
            time.sleep(pause)
            notes.append(kernel.run(note)[0])
    return statistics.median(starts), statistics.median(notes)


def round_trips(name, setup, line, count):
    with Kernel(name) as kernel:
        if setup:
            kernel.run(setup)
        for _ in range(count):
            kernel.run(line)
        return statistics.median(kernel.run(line)[0] for _ in range(count))


def output(name, setup, code, rounds):
    times = []
    with Kernel(name) as kernel:
        kernel.run(setup)
        for _ in range(rounds):
            seconds, printed = kernel.run(code)
            assert printed == LINES * 63, f"{printed} characters arrived"
            times.append(seconds)
    return statistics.median(times)


def row(what, ours, theirs):
    ratio = f"{theirs / ours:6.2f}" if theirs else "      "
    beside = f"{theirs * 1000:9.1f}" if theirs else " " * 9
    print(f"{what:34} {ours * 1000:9.1f} {beside}   {ratio}", flush=True)


def main():
    parser = argparse.ArgumentParser(
        description=__doc__, formatter_class=argparse.RawDescriptionHelpFormatter
    )
    parser.add_argument("--rounds", type=int, default=9, help="processes for each cold start")
    parser.add_argument("--trips", type=int, default=300, help="round trips, as many to warm up")
    parser.add_argument("--whorl", default="whorl", help="name of the kernel to measure")
    given = parser.parse_args()
    print(f"{'milliseconds':34} {'Whorl':>9} {'ipykernel':>9}   ipykernel / Whorl")
    start, note = cold(given.whorl, WHORL_NOTE, given.rounds)
    their_start, their_note = cold("python3", PINT_NOTE, given.rounds)
    row("start to first kernel_info", start, their_start)
    row("first note of ten lines, cold", note, their_note)
    row("start and first note", start + note, their_start + their_note)
    later = cold(given.whorl, WHORL_NOTE, given.rounds, pause=2)[1]
    their_later = cold("python3", PINT_NOTE, given.rounds, pause=2)[1]
    row("first note, two seconds later", later, their_later)
    row(
        "round trip of one line, warm",
        round_trips(given.whorl, None, WHORL_LINE, given.trips),
        round_trips("python3", PINT_SETUP, PINT_LINE, given.trips),
    )
    row(
        "10 MB printed in short lines",
        output(given.whorl, "%%java\n1 + 1", WHORL_OUTPUT, 3),
        output("python3", "1 + 1", PYTHON_OUTPUT, 3),
    )
    bare_start, bare_note = cold(given.whorl, WHORL_NOTE, given.rounds, without_archive=True)
    row("without archive: start", bare_start, None)
    row("without archive: first note", bare_note, None)
    first_java = cold(given.whorl, "%%java\n6 * 7", max(3, given.rounds // 3))[1]
    row("first cell in Java, cold", first_java, None)
    row("one line of Java, warm", round_trips(given.whorl, None, "%%java\n6 * 7", 50), None)


if __name__ == "__main__":
    main()
