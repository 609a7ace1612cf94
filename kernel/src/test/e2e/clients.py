#!/usr/bin/env python3
"""End-to-end checks with clients that know nothing of cells: nbclient, nbconvert, jupyter-console.

Runs in the environment of whorl lab, with requirements.txt. Stops at the first check that fails.
"""

import json
import os
import pathlib
import re
import subprocess
import sys

import nbclient
import nbformat
import pexpect

from checks import DEMOS, STEPS, notebook, read, run, whorl, write

PATIENCE = 60
JUPYTER = pathlib.Path(sys.prefix) / "bin"
WHORL_KERNEL = {"kernelspec": {"display_name": "Whorl", "language": "whorl", "name": "whorl"}}


def executed(note, **options):
    """A notebook as nbclient leaves it."""
    note = nbformat.reads(json.dumps(note), as_version=4)
    nbclient.NotebookClient(note, timeout=PATIENCE, **options).execute()
    nbformat.validate(note)
    return note


def outputs(note):
    return [output for cell in note["cells"] for output in cell.get("outputs", [])]


def recorded(note):
    """The results of all cells."""
    return [o["data"][STEPS] for o in outputs(note) if STEPS in o.get("data", {})]


# ---- nbclient ------------------------------------------------------------------------------------


def nbclient_gets_the_results_that_are_stored_in_the_demos(folder):
    for demo in DEMOS:
        stored = read(demo)
        fresh = executed(stored)
        assert [o["output_type"] for o in outputs(fresh) if o["output_type"] == "error"] == []
        assert recorded(fresh) == recorded(stored) and recorded(fresh), demo.name


def nbclient_stops_at_a_wrong_cell(folder):
    note = notebook("n [rpm] = 6000", "t [s] = n", "x = 1", **WHORL_KERNEL)
    try:
        executed(note)
    except nbclient.exceptions.CellExecutionError as error:
        assert "t is declared as a time" in str(error), error
    else:
        raise AssertionError("the error was not reported")
    fresh = executed(note, allow_errors=True)
    assert [len(recorded({"cells": [cell]})) for cell in fresh["cells"]] == [1, 0, 1], fresh


def results_elsewhere_are_refreshed_in_what_nbclient_writes(folder):
    note = notebook("y = 2 * x", "x = 3", "x_2 = y + 1", **WHORL_KERNEL)
    fresh = executed(note)
    values = {name: d["value"] for r in recorded(fresh) for name, d in r["definitions"].items()}
    assert values == {"y": 6, "x": 3, "x_2": 7}, values


def notebooks_in_plain_java_run_unchanged(folder):
    java = {"kernelspec": {"display_name": "Java", "language": "java", "name": "java"}}
    note = notebook(
        "import java.util.stream.*;\nrecord Disc(double mass, double radius) {}",
        "double inertia(Disc d) { return d.mass() * d.radius() * d.radius() / 2; }",
        "inertia(new Disc(412, 0.45))",
        'IntStream.range(0, 3).forEach(i -> System.out.println("line " + i));',
        **java,
    )
    fresh = executed(note, kernel_name="whorl-java")
    told = outputs(fresh)
    assert [o["output_type"] for o in told] == ["execute_result", "stream"], told
    assert abs(float(told[0]["data"]["text/plain"]) - 41.715) < 1e-6, told
    assert told[1]["text"] == "line 0\nline 1\nline 2\n", told


# ---- nbconvert and nbformat ----------------------------------------------------------------------


def a_note_becomes_a_page_in_html(folder):
    demo = DEMOS[0]
    subprocess.run(
        [JUPYTER / "jupyter-nbconvert", "--to", "html", "--execute", demo, "--output-dir", folder],
        check=True,
        timeout=4 * PATIENCE,
        capture_output=True,
    )
    page = (folder / demo.with_suffix(".html").name).read_text(encoding="utf-8")
    # Steps are tables of ours, not their text forms; a motion has tables of its own among them.
    heads = page.count(">quantity</span></th>")
    assert heads == len(recorded(read(demo))), heads
    assert "holds" in page and "output_error" not in page


def notes_run_by_the_command_are_valid_and_written_as_jupyter_writes(folder):
    for demo in DEMOS:
        out = folder / demo.name
        whorl("run", demo, "--out", out)
        note = nbformat.read(out, as_version=nbformat.NO_CONVERT)
        nbformat.validate(note)
        again = folder / "again.ipynb"
        nbformat.write(note, again, version=nbformat.NO_CONVERT)
        assert again.read_bytes() == out.read_bytes(), f"Jupyter changes {demo.name}"


# ---- jupyter-console -----------------------------------------------------------------------------


class Console:
    """A terminal with jupyter-console in it."""

    def __init__(self, folder, kernel="whorl"):
        self.child = pexpect.spawn(
            str(JUPYTER / "jupyter-console"),
            ["--simple-prompt", "--no-confirm-exit", f"--kernel={kernel}"],
            env={**os.environ, "HOME": str(folder), "TERM": "dumb"},
            encoding="utf-8",
            timeout=PATIENCE,
            dimensions=(50, 200),
        )
        self.number = 1
        self.said_until_prompt()

    def said_until_prompt(self):
        self.child.expect_exact(f"In [{self.number}]: ")
        self.number += 1
        return re.sub(r"\x1b\[[0-9;?]*[a-zA-Z]", "", self.child.before)

    def answer(self, line):
        """What is printed for a line; the simple prompt takes one at a time."""
        self.child.sendline(line)
        return self.said_until_prompt()

    def close(self):
        self.child.sendeof()
        self.child.expect(pexpect.EOF)
        self.child.close()


def a_sheet_can_be_typed_into_the_console(folder):
    console = Console(folder)
    assert "412 kg" in console.answer("m [kg] = 412")
    console.answer("D [mm] = 900")
    assert "41.72 kg·m²" in console.answer("I [kg·m²] = 1/2 * m * (D/2)^2")
    assert "83.43 kg·m²" in console.answer("2 * I"), "the last definition holds"
    assert "I ≈ 10.12 kg·m²" in console.answer("m [kg] = 100"), "what came of the change"
    assert "20.25 kg·m²" in console.answer("2 * I")
    assert "t is declared as a time" in console.answer("t [s] = m")
    console.close()


def java_can_be_typed_into_the_console(folder):
    console = Console(folder, "whorl-java")
    console.answer("int twice(int x) { return 2 * x; }")
    assert "42" in console.answer("twice(21)")
    assert "cannot find symbol" in console.answer("half(21)")
    console.close()


# ---- whorl lab -----------------------------------------------------------------------------------


def a_later_start_of_lab_needs_no_network(folder):
    offline = {"PIP_INDEX_URL": "http://127.0.0.1:9/", "WHORL_PYTHON": "no"}
    started = whorl("lab", "--version", env={"WHORL_LAB": sys.prefix, **offline}).expect(0)
    assert started.out.startswith("4.") and started.err == "", started.err


CHECKS = [
    nbclient_gets_the_results_that_are_stored_in_the_demos,
    nbclient_stops_at_a_wrong_cell,
    results_elsewhere_are_refreshed_in_what_nbclient_writes,
    notebooks_in_plain_java_run_unchanged,
    a_note_becomes_a_page_in_html,
    notes_run_by_the_command_are_valid_and_written_as_jupyter_writes,
    a_sheet_can_be_typed_into_the_console,
    java_can_be_typed_into_the_console,
    a_later_start_of_lab_needs_no_network,
]

if __name__ == "__main__":
    sys.exit(run(__doc__, CHECKS))
