#!/usr/bin/env python3
"""End-to-end checks of running kernels, through jupyter_client: the page stays right while it is
edited, cells can be interrupted, and nothing that a client does ends the kernel.

Runs in the environment of whorl lab, with requirements.txt. Stops at the first check that fails.
"""

import json
import math
import os
import random
import signal
import subprocess
import sys
import textwrap
import time

import psutil
import zmq
from jupyter_client.session import Session

from checks import run
from jupyter_kernel import PATIENCE, Kernel, Page, without_colours

JAVA = "%%java\n"
FLYWHEEL = {
    "in": "m [kg] = 412   # weighed\nD [mm] = 900\nn [rpm] = 6000",
    "body": "I [kg·m²] = 1/2 * m * (D/2)^2",
    "energy": "E [MJ] = 1/2 * I * n^2",
    "limit": "check E <= 10 MJ",
}


def flywheel(kernel):
    page = Page(kernel)
    for cell, code in FLYWHEEL.items():
        page.run(cell, code).succeeded()
    return page


# ---- a page that is edited -----------------------------------------------------------------------


def dependents_are_refreshed_in_place(folder):
    with Kernel() as kernel:
        page = flywheel(kernel)
        before = {cell: dict(outputs) for cell, outputs in page.outputs.items()}
        assert "holds" in page.text("limit"), page.text("limit")
        answer = page.run("in", FLYWHEEL["in"].replace("6000", "7000")).succeeded()
        # E = m D² n² / 16 in coherent units
        values, verdicts = page.results()
        expected = 412 * 0.9**2 / 16 * (7000 * math.pi / 30) ** 2
        assert abs(values["E"] / expected - 1) < 1e-12, (values, expected)
        assert list(verdicts.values()) == [False], verdicts
        assert "FAILS" in page.text("limit"), page.text("limit")
        changed = set(answer.updated())
        assert changed == {*before["energy"], *before["limit"]}, (changed, before.keys())
        for cell in ("energy", "limit"):
            for id, old in before[cell].items():
                new = page.outputs[cell][id]
                assert new["data"].keys() == old["data"].keys(), "other forms than before"
                assert new["metadata"] == old["metadata"], "some front ends replace more then"
        told = answer.shown() + answer.printed()
        assert "E" in told and "FAILS" in told, f"the cell does not say what it changed: {told}"


def what_did_not_change_is_not_sent_again(folder):
    with Kernel() as kernel:
        page = flywheel(kernel)
        assert page.run("in", FLYWHEEL["in"]).succeeded().updated() == {}
        assert page.run("new", "x = 1").succeeded().updated() == {}
        assert page.run("limit", "check E <= 11 MJ").succeeded().updated() == {}


def deleted_cells_withdraw_their_names_until_they_run_again(folder):
    with Kernel() as kernel:
        page = flywheel(kernel)
        page.run("new", "x = 1", deleted=["body"]).succeeded()
        assert page.results()[0].keys() == {"m", "D", "n", "x"}, page.results()
        assert "waits for I" in page.text("energy"), page.text("energy")
        assert "waits for E" in page.text("limit"), page.text("limit")
        page.run("body", FLYWHEEL["body"]).succeeded()
        assert {"E", "I"} <= page.results()[0].keys(), page.results()
        assert "holds" in page.text("limit"), page.text("limit")


def a_wrong_cell_changes_nothing(folder):
    with Kernel() as kernel:
        page = flywheel(kernel)
        kept = page.results()
        answer = kernel.run("n [rpm] = 7000\nt [s] = n", "in").failed("t", "angular velocity")
        assert answer.updated() == {} and answer.displayed() == {}, answer.published
        assert "^" in without_colours("\n".join(answer.content["traceback"])), "no caret"
        assert page.run("limit", FLYWHEEL["limit"]).succeeded().status == "ok"
        assert page.results() == kept


def a_client_without_ids_is_served_as_a_console(folder):
    with Kernel() as kernel:
        kernel.run("n [rpm] = 6000").succeeded()
        kernel.run("w [rad/s] = n").succeeded()
        kernel.run("n [rpm] = 3000").succeeded()
        assert "314.2" in kernel.run("w [rad/s]").succeeded().shown()


def two_pages_may_have_cells_of_the_same_id(folder):
    with Kernel() as kernel:
        kernel.run("a = 1", "x").succeeded()
        other = kernel.manager.client(session=Session(key=kernel.manager.session.key))
        other.start_channels()
        try:
            message = other.session.msg(
                "execute_request", {"code": "b = 2", "silent": False}, metadata={"cellId": "x"}
            )
            other.shell_channel.send(message)
            other.get_shell_msg(timeout=PATIENCE)
        finally:
            other.stop_channels()
        kernel.run("c = a + b", "y").succeeded()


def random_cell(random, number):
    """A cell that defines two names by those of cells above it, which may not be there."""
    earlier = [f"{letter}{i}" for i in range(number) for letter in "ab"]
    lines = []
    for name in (f"a{number}", f"b{number}"):
        terms = [str(random.randint(1, 9)), *random.sample(earlier, min(2, len(earlier)))]
        lines.append(f"{name} = {random.choice('+*').join(terms)}")
    return "\n".join([*lines, f"check a{number} <= {random.randint(1, 500)}"])


def edited_at_random(random, page):
    """Runs cells in any order, changes some, deletes some and brings them back."""
    numbers = list(range(12))
    random.shuffle(numbers)
    for number in numbers + random.choices(numbers, k=25):
        others = [cell for cell in page.cells if cell != f"c{number:02}"]
        deleted = random.sample(others, 1) if len(others) > 8 and random.random() < 0.1 else []
        page.run(f"c{number:02}", random_cell(random, number), deleted).succeeded()


def restart_and_run_all_gives_the_page_that_editing_gave(folder):
    values = 0
    with Kernel() as kernel:
        for seed in range(3):
            page = Page(kernel)
            edited_at_random(random.Random(seed), page)
            kernel.restart()
            fresh = Page(kernel)
            for cell in sorted(page.cells):
                fresh.run(cell, page.cells[cell]).succeeded()
            kernel.restart()
            values += len(page.results()[0])
            assert fresh.results() == page.results(), seed
            for cell in page.cells:
                assert fresh.steps(cell) == page.steps(cell), f"seed {seed}, {cell}"
    assert values > 25, f"{values} values on three pages show little"


# ---- what a front end asks -----------------------------------------------------------------------


def language_services_know_the_sheet(folder):
    with Kernel() as kernel:
        flywheel(kernel)
        reply = kernel.ask("complete_request", code="x = omega_n + 5 rp", cursor_pos=18)
        assert "rpm" in reply["matches"], reply
        # Places are counted in code points, of which 𝜔 is one and in UTF-16 two.
        reply = kernel.ask("complete_request", code="# 𝜔𝜔𝜔\nx = \\alph", cursor_pos=15)
        start, end = reply["cursor_start"], reply["cursor_end"]
        assert "α" in reply["matches"] and (start, end) == (10, 15), reply
        reply = kernel.ask("inspect_request", code="z = E", cursor_pos=5, detail_level=0)
        assert reply["found"] and "energy" in reply["data"]["text/plain"], reply
        for code, status in {
            "x = 1": "complete",
            "x = (1 +": "incomplete",
            "x = )": "invalid",
        }.items():
            assert kernel.ask("is_complete_request", code=code)["status"] == status, code
        values = kernel.run("x = 1", user_expressions={"v": "2*E", "w": "nothing"}).content
        told = values["user_expressions"]
        assert told["v"]["status"] == "ok" and "16.47" in told["v"]["data"]["text/plain"], told
        assert told["w"]["status"] == "error", told


def a_cell_in_java_can_ask_for_a_line(folder):
    with Kernel() as kernel:
        kernel.run("n [rpm] = 6000", "a").succeeded()
        code = JAVA + "String line = new java.util.Scanner(System.in).nextLine();\nline.length()"
        request = kernel.execute(code, "b", allow_stdin=True)
        asked = kernel.client.get_stdin_msg(timeout=PATIENCE)
        assert asked["msg_type"] == "input_request", asked
        kernel.client.input("five!")
        assert kernel.wait(request).succeeded().shown() == "5"


# ---- interrupt -----------------------------------------------------------------------------------


def interrupted_soon(kernel, code, cell, words):
    request = kernel.execute(code, cell)
    kernel.wait_for_published(request, "execute_input")
    time.sleep(0.3)
    begin = time.monotonic()
    kernel.interrupt()
    answer = kernel.wait(request).failed(*words)
    return answer, time.monotonic() - begin


def loops_in_java_can_be_interrupted(folder):
    with Kernel() as kernel:
        kernel.run("n [rpm] = 6000", "a").succeeded()
        kernel.run(JAVA + "int kept = 42;", "b").succeeded()
        took = []
        for loop in ["while (true) {}", "Thread.sleep(1_000_000);"] * 10:
            took.append(interrupted_soon(kernel, JAVA + loop, "c", ["nterrupt"])[1])
            assert kernel.run(JAVA + "kept", "d").succeeded().shown() == "42"
        kernel.run("w [rad/s] = n", "e").succeeded()
        assert sorted(took)[len(took) // 2] < 0.5, took


def a_loop_that_cannot_be_ended_costs_the_java_side_only(folder):
    with Kernel() as kernel:
        kernel.run("n [rpm] = 6000", "a").succeeded()
        loop = "while (true) { try { while (true) {} } catch (Throwable t) {} }"
        interrupted_soon(kernel, JAVA + loop, "b", ["nterrupt"])
        kernel.run("w [rad/s] = n", "c").succeeded()
        assert kernel.run(JAVA + "6 * 7", "d").succeeded().shown() == "42"


def long_work_on_the_sheet_can_be_interrupted(folder):
    doubling = ["f0(x) = x + 1"]
    doubling += [f"f{i}(x) = f{i - 1}(x) + f{i - 1}(x + 1)" for i in range(1, 25)]
    with Kernel() as kernel:
        kernel.run("a = 1", "a").succeeded()
        kernel.run("\n".join(doubling), "f").succeeded()
        kernel.run("b = a + 1", "b").succeeded()
        calls = "\n".join(f"y{i} = f24(a + {i})" for i in range(40))
        _, took = interrupted_soon(kernel, calls, "c", ["nterrupt"])
        assert took < 2, took
        kernel.run("y0 = 3", "d").succeeded()
        kernel.run("z = y0 + b", "e").succeeded()


def an_interrupt_that_comes_late_harms_nothing(folder):
    with Kernel() as kernel:
        for i in range(50):
            kernel.send("interrupt_request", {}, channel="control")
            kernel.run(f"a = {i}", "a")
        kernel.run("b = a + 1", "b").succeeded()


def a_shut_down_kernel_ends(folder):
    with Kernel() as kernel:
        flywheel(kernel)
        process = kernel.process
        kernel.manager.shutdown_kernel()
        assert process.poll() is not None
    with Kernel() as kernel:
        request = kernel.execute(JAVA + "while (true) {}", "a")
        kernel.wait_for_published(request, "execute_input")
        process = kernel.process
        kernel.manager.shutdown_kernel()
        assert process.poll() is not None


def a_kernel_that_is_told_to_terminate_ends(folder):
    for code in ("x = 1", JAVA + "while (true) {}"):
        with Kernel() as kernel:
            request = kernel.execute(code, "a")
            kernel.wait_for_published(request, "execute_input")
            process = psutil.Process(kernel.process.pid)
            process.terminate()
            process.wait(timeout=PATIENCE)


def a_kernel_ends_with_the_program_that_started_it(folder):
    script = textwrap.dedent(
        """
        import time
        from jupyter_client import KernelManager
        manager = KernelManager(kernel_name="whorl")
        manager.start_kernel()
        manager.client().start_channels()
        print(manager.provisioner.process.pid, flush=True)
        time.sleep(1000)
        """
    )
    owner = subprocess.Popen([sys.executable, "-c", script], stdout=subprocess.PIPE)
    process = psutil.Process(int(owner.stdout.readline()))
    time.sleep(3)
    owner.send_signal(signal.SIGKILL)
    owner.wait()
    process.wait(timeout=PATIENCE)


# ---- load, idleness, bad peers -------------------------------------------------------------------


def much_output_arrives_whole_and_in_order(folder):
    lines = 160_000
    with Kernel() as kernel:
        kernel.run(JAVA + "1 + 1", "a").succeeded()
        code = (
            f"for (int i = 0; i < {lines}; i++) "
            'System.out.println(String.format("%062d", i));'
        )
        begin = time.monotonic()
        answer = kernel.run(JAVA + code, "b").succeeded()
        took = time.monotonic() - begin
        printed = answer.printed().splitlines()
        assert [int(line) for line in printed] == list(range(lines)), (len(printed), printed[-1])
        assert sum(len(line) + 1 for line in printed) > 10_000_000
        print(f"      ({lines} lines in {took:.1f} s, {len(answer.of('stream'))} messages)")


def processor_time(process, seconds):
    """What a process uses within some seconds."""
    before = process.cpu_times()
    time.sleep(seconds)
    after = process.cpu_times()
    return after.user + after.system - before.user - before.system


def an_idle_kernel_uses_no_processor_time(folder):
    for warm in ("x = 1", JAVA + "1 + 1"):
        with Kernel() as kernel:
            kernel.run(warm, "a").succeeded()
            # The heartbeat is the client's doing.
            kernel.client.hb_channel.pause()
            process = psutil.Process(kernel.process.pid)
            # A kernel that has just started still warms up.
            end = time.monotonic() + PATIENCE
            while processor_time(process, 1) > 0.01 and time.monotonic() < end:
                pass
            used = processor_time(process, 5)
            assert used <= 0.05, f"{used} s in 5 s"


def the_kernel_listens_on_the_loopback_only(folder):
    with Kernel() as kernel:
        listening = [
            c.laddr.ip
            for c in psutil.Process(kernel.process.pid).net_connections("inet")
            if c.status == psutil.CONN_LISTEN
        ]
        assert len(listening) == 5, listening
        assert {ip.replace("::ffff:", "") for ip in listening} == {"127.0.0.1"}, listening


def raw_socket(kernel, port="shell_port"):
    """A peer that keeps to no rules."""
    socket = zmq.Context.instance().socket(zmq.DEALER)
    socket.linger = 2_000
    socket.connect(f"tcp://127.0.0.1:{kernel.manager.get_connection_info()[port]}")
    return socket


def bad_peers_do_not_end_the_kernel(folder):
    with Kernel() as kernel:
        session = kernel.client.session
        message = session.msg("execute_request", {"code": "evil = 1", "silent": False})
        right = session.serialize(message)

        def signed(*parts):
            return [b"<IDS|MSG>", session.sign(list(parts)), *parts]

        header = json.dumps(message["header"], default=str).encode()
        unknown = session.serialize(session.msg("no_such_request", {}))
        no_content = session.serialize(session.msg("execute_request", {}))
        odd_content = session.serialize(session.msg("execute_request", {"code": 7, "silent": "?"}))
        cases = [
            [right[0], b"0" * 64, *right[2:]],
            [right[0], b"", *right[2:]],
            [b"<IDS|MSG>"],
            [b""],
            [b"\xff\xfe", b"<IDS|MSG>", b"x"],
            right[:-1],
            signed(header, b"{}", b"{}", b"{not json"),
            signed(b"[]", b"{}", b"{}", b"{}"),
            signed(b"{}", b"{}", b"{}", b"{}"),
            signed(header, b"{}", b"{}", b"\xff\xff"),
            signed(b'{"msg_type": "execute_request"}', b"{}", b"{}", b'{"code": "evil = 1"}'),
            signed(header, b"{}", b"{}", b"[" * 200_000),
            unknown,
            no_content,
            odd_content,
            [os.urandom(1000) for _ in range(20)],
        ]
        for port in ("shell_port", "control_port", "stdin_port", "hb_port"):
            with raw_socket(kernel, port) as socket:
                for frames in cases:
                    socket.send_multipart(frames)
        kernel.run("n [rpm] = 6000", "a").succeeded()
        assert "waits for evil" in kernel.run("b = evil + 1", "b").succeeded().shown()
        assert kernel.ask("kernel_info_request")["status"] == "ok"
        assert kernel.interrupt()["status"] == "ok"


def a_very_long_cell_is_answered(folder):
    with Kernel() as kernel:
        kernel.run("a = 1", "a").succeeded()
        kernel.wait(kernel.execute("# " + "x" * 20_000_000 + "\nb = 2", "b"))
        kernel.wait(kernel.execute("c = " + "1 + " * 5_000_000 + "1", "c"))
        kernel.run("d = a + 1", "d").succeeded()


def a_client_that_vanishes_leaves_the_kernel_to_others(folder):
    with Kernel() as kernel:
        kernel.run(JAVA + "1 + 1", "a").succeeded()
        session = kernel.client.session
        noise = JAVA + 'for (int i = 0; i < 50_000; i++) System.out.println("x".repeat(60));'
        for _ in range(3):
            socket = raw_socket(kernel)
            socket.send_multipart(
                session.serialize(session.msg("execute_request", {"code": noise, "silent": False}))
            )
            time.sleep(0.3)
            socket.close(linger=100)
        kernel.run("b = 1", "b").succeeded()


def queued_requests_are_served_in_order_and_aborted_after_an_error(folder):
    with Kernel() as kernel:
        requests = [kernel.execute(f"a{i} = {i}", f"c{i}") for i in range(50)]
        answers = [kernel.wait(request).succeeded() for request in requests]
        counts = [answer.content["execution_count"] for answer in answers]
        assert counts == list(range(counts[0], counts[0] + 50)), counts
        pause = kernel.execute(JAVA + 'Thread.sleep(1500); throw new Exception("on purpose");', "p")
        queued = [kernel.execute(f"b{i} = {i}", f"d{i}") for i in range(20)]
        asked = kernel.send("kernel_info_request", {})
        kernel.wait(pause).failed("on purpose")
        assert {kernel.wait(request).status for request in queued} == {"aborted"}
        assert kernel.wait(asked).status == "ok"
        kernel.run("b0 = 1", "e").succeeded()


def silent_cells_leave_no_trace(folder):
    with Kernel() as kernel:
        count = kernel.run("a = 1", "a").succeeded().content["execution_count"]
        answer = kernel.run("b = 2", "b", silent=True).succeeded()
        assert [m["msg_type"] for m in answer.published] == ["status", "status"], answer.published
        assert answer.content["execution_count"] == count
        kernel.run("c = a + b", "c", store_history=False).succeeded()
        tail = kernel.ask("history_request", hist_access_type="tail", n=10, output=False, raw=True)
        assert [line[2] for line in tail["history"]] == ["a = 1"], tail


# ---- Java beside the sheet -----------------------------------------------------------------------


def java_and_the_sheet_share_a_page(folder):
    with Kernel() as kernel:
        page = flywheel(kernel)
        read = JAVA + 'double e = sheet.value("E", "MJ");\ne'
        assert abs(float(page.run("java", read).succeeded().shown()) - 8.23421) < 1e-5
        answer = page.run("in", FLYWHEEL["in"].replace("6000", "7000")).succeeded()
        assert "E" in answer.shown() + answer.printed(), answer.published


def plain_java_notebooks_run_unchanged(folder):
    with Kernel("whorl-java") as kernel:
        kernel.run("import java.util.*;\nint twice(int x) { return 2 * x; }", "a").succeeded()
        assert kernel.run("twice(21)", "b").succeeded().shown() == "42"
        assert kernel.run('System.out.print("hé𝜔");', "c").succeeded().printed() == "hé𝜔"
        kernel.run("int x = ", "d").failed()
        kernel.run('throw new IllegalStateException("on purpose");', "e").failed("on purpose")
        kernel.run("%%sheet\nn [rpm] = 6000", "f").succeeded()
        assert kernel.run('sheet.value("n", "rad/s")', "g").succeeded().shown().startswith("628.3")


CHECKS = [
    dependents_are_refreshed_in_place,
    what_did_not_change_is_not_sent_again,
    deleted_cells_withdraw_their_names_until_they_run_again,
    a_wrong_cell_changes_nothing,
    a_client_without_ids_is_served_as_a_console,
    two_pages_may_have_cells_of_the_same_id,
    restart_and_run_all_gives_the_page_that_editing_gave,
    language_services_know_the_sheet,
    a_cell_in_java_can_ask_for_a_line,
    loops_in_java_can_be_interrupted,
    a_loop_that_cannot_be_ended_costs_the_java_side_only,
    long_work_on_the_sheet_can_be_interrupted,
    an_interrupt_that_comes_late_harms_nothing,
    a_shut_down_kernel_ends,
    a_kernel_that_is_told_to_terminate_ends,
    a_kernel_ends_with_the_program_that_started_it,
    much_output_arrives_whole_and_in_order,
    an_idle_kernel_uses_no_processor_time,
    the_kernel_listens_on_the_loopback_only,
    bad_peers_do_not_end_the_kernel,
    a_very_long_cell_is_answered,
    a_client_that_vanishes_leaves_the_kernel_to_others,
    queued_requests_are_served_in_order_and_aborted_after_an_error,
    silent_cells_leave_no_trace,
    java_and_the_sheet_share_a_page,
    plain_java_notebooks_run_unchanged,
]

if __name__ == "__main__":
    sys.exit(run(__doc__, CHECKS))
