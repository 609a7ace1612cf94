#!/usr/bin/env python3
"""End-to-end checks of the whorl command, as a user starts it. Needs Python 3.9 and nothing else.

Stops at the first check that fails.
"""

import copy
import hashlib
import json
import pathlib
import subprocess
import sys

from checks import DEMOS, ROOT, STEPS, WHORL, code, notebook, prose, read, run, whorl, write


def without_results(note):
    note = copy.deepcopy(note)
    for cell in note["cells"]:
        if cell["cell_type"] == "code":
            cell["outputs"] = []
            cell["execution_count"] = None
    return note


def records(note):
    """The stored results of all cells."""
    for cell in note["cells"]:
        for output in cell.get("outputs", []):
            if STEPS in output.get("data", {}):
                yield output["data"][STEPS]


# ---- the launcher --------------------------------------------------------------------------------


def the_launcher_tells_its_version(folder):
    result = whorl("--version").expect(0, out="whorl ")
    assert result.err == "", f"once built, nothing is said: {result.err}"


def the_launcher_works_through_links_from_any_folder(folder):
    (folder / "with blank").mkdir()
    first = folder / "with blank" / "first link"
    first.symlink_to(WHORL)
    second = folder / "second"
    second.symlink_to(pathlib.Path("with blank") / "first link")
    whorl("--version", command=second, cwd="/").expect(0, out="whorl ")
    whorl("--version", command="./second", cwd=folder).expect(0, out="whorl ")


def several_starts_at_once_do_not_disturb_each_other(folder):
    for archive in (ROOT / "kernel" / "target").glob("*.jsa"):
        archive.unlink()
    starts = [
        subprocess.Popen([WHORL, "--version"], stdout=subprocess.PIPE, stderr=subprocess.PIPE)
        for _ in range(3)
    ]
    for start in starts:
        out, err = start.communicate(timeout=600)
        assert (start.returncode, err) == (0, b"") and out.startswith(b"whorl "), (out, err)


def a_damaged_archive_of_classes_does_not_matter(folder):
    for archive in (ROOT / "kernel" / "target").glob("*.jsa"):
        archive.chmod(0o644)
        archive.write_bytes(b"damaged")
    result = whorl("--version").expect(0, out="whorl ")
    assert result.err == "", result.err
    for archive in (ROOT / "kernel" / "target").glob("*.jsa"):
        archive.unlink()


def an_old_or_missing_jdk_is_named(folder):
    old = folder / "old"
    (old / "bin").mkdir(parents=True)
    (old / "release").write_text('IMPLEMENTOR="Any"\nJAVA_VERSION="11.0.2"\n')
    java = old / "bin" / "java"
    java.write_text("#!/bin/sh\nexit 1\n")
    java.chmod(0o755)
    whorl("--version", env={"JAVA_HOME": str(old)}).expect(
        3, err="a JDK, 17 or newer, is needed, but " + str(java) + " is version 11.0.2"
    )
    whorl("--version", env={"JAVA_HOME": str(folder)}).expect(3, err="there is no bin/java in it")


# ---- the command line ----------------------------------------------------------------------------


def wrong_commands_are_explained(folder):
    whorl().expect(3, err="a command is missing: run, recheck")
    whorl("rnu").expect(3, err="there is no such command; there are: run, recheck")
    whorl("run").expect(3, err="NOTE")
    whorl("run", "a.ipynb", "--colour").expect(3, err="--colour")
    whorl("--help").expect(0, out="recheck")
    whorl("run", "--help").expect(0, out="--set")


def files_that_are_no_notes_are_refused(folder):
    def file(name, content):
        path = folder / name
        path.write_bytes(content if isinstance(content, bytes) else content.encode("utf-8"))
        return path

    python = notebook("print(1)", kernelspec={"language": "python", "name": "python3"})
    cases = [
        (folder / "missing.ipynb", "there is no file"),
        (folder, "is neither a notebook"),
        (file("note.txt", "m = 1"), "is neither a notebook"),
        (file("empty.ipynb", ""), "line 1, column 1"),
        (file("cut.ipynb", '{\n "cells": ['), "line 2, column 12"),
        (file("list.ipynb", "[]"), "not a notebook"),
        (file("old.ipynb", '{"nbformat": 3, "worksheets": []}'), "this notebook is format 3"),
        (write(folder / "python.ipynb", python), "is a note in python"),
        (file("latin.whorl", b"# caf\xe9\n"), "line 1, column 6"),
        (file("deep.ipynb", "[" * 100_000), "nested deeper"),
    ]
    for path, message in cases:
        for command in ("run", "recheck"):
            result = whorl(command, path).expect(3, err=message)
            assert result.out == "" and "Exception" not in result.err, result.err


# ---- running notes -------------------------------------------------------------------------------

FLYWHEEL = [
    prose("# Flywheel\n\nProse that is not printed.\n"),
    "m [kg] = 412   # weighed\nD [mm] = 900\nn [rpm] = 6000\n",
    "I [kg·m²] = 1/2 * m * (D/2)^2\nE [MJ] = 1/2 * I * n^2\n",
    "",
    "check E <= 10 MJ",
]


def a_note_is_printed_and_summed_up(folder):
    note = write(folder / "note.ipynb", notebook(*FLYWHEEL))
    before = note.read_bytes()
    result = whorl("run", note).expect(0, out="# Flywheel")
    assert "weighed" in result.out and "Prose" not in result.out, result.out
    assert "5 results; 1 check holds" in result.err, result.err
    assert note.read_bytes() == before, "the note was changed"


def results_are_written_at_full_precision(folder):
    note = write(folder / "note.ipynb", notebook(*FLYWHEEL))
    whorl("run", note, "--json", folder / "r.json").expect(0)
    record = json.loads((folder / "r.json").read_text(encoding="utf-8"))
    energy = record["definitions"]["E"]
    # E = m D² n² / 16 in coherent units, n = 6000 rpm = 200π rad/s.
    expected = 412 * 0.9**2 * (200 * 3.141592653589793) ** 2 / 16
    assert abs(energy["si"] / expected - 1) < 1e-14, (energy, expected)
    assert (energy["unit"], energy["kind"]) == ("MJ", "energy"), energy
    assert record["definitions"]["n"]["value"] == 6000, record
    assert record["checks"][0]["holds"] is True and record["errors"] == [], record
    printed = whorl("run", note, "--json", "-").expect(0)
    assert json.loads(printed.out) == record, "the printed record is the written one"


def only_outputs_change_in_an_executed_note(folder):
    original = notebook(*FLYWHEEL, tool={"own": [1.0, None, "é"]})
    original["cells"][1]["metadata"] = {"tags": ["inputs"]}
    note = write(folder / "note.ipynb", original)
    out = folder / "out.ipynb"
    whorl("run", note, "--out", out).expect(0)
    executed = read(out)
    assert without_results(executed) == original, "something else than outputs changed"
    assert out.read_text(encoding="utf-8") == json.dumps(
        executed, indent=1, sort_keys=True, ensure_ascii=False
    ) + "\n", "the layout is not Jupyter's"
    counts = [cell.get("execution_count") for cell in executed["cells"]]
    assert counts == [None, 1, 2, None, 3], counts
    names = [name for record in records(executed) for name in record["definitions"]]
    assert sorted(names) == ["D", "E", "I", "m", "n"], names
    first = out.read_bytes()
    whorl("run", out, "--out", out).expect(0)
    assert out.read_bytes() == first, "running it again changed it"
    whorl("recheck", out).expect(0, out="All agrees with the file: 6 results and verdicts.")


def inputs_can_be_set_for_a_run(folder):
    note = write(folder / "note.ipynb", notebook(*FLYWHEEL))
    out = folder / "out.ipynb"
    whorl("run", note, "--set", "n=7000 rpm", "--out", out).expect(1, err="check E <= 10 MJ")
    source = "".join(read(out)["cells"][1]["source"])
    assert "n [rpm] = 7000 rpm" in source and "# weighed" in source, source
    whorl("recheck", out).expect(1, out="All agrees")
    whorl("run", note, "--set", "x=1 m").expect(3, err="there is no input x")
    whorl("run", note, "--set", "E=1 MJ").expect(3, err="only an input can be set")
    whorl("run", note, "--set", "n").expect(3, err="--set")
    whorl("run", note, "--set", "n=1 rpm", "--set", "n=2 rpm").expect(3, err="set twice")
    whorl("run", note, "--set", "n=3 kg").expect(2, err="cell 2, line 3")


def a_failed_check_is_status_1(folder):
    note = write(folder / "note.ipynb", notebook("m [kg] = 4", "check m <= 3 kg", "m [g]"))
    result = whorl("run", note).expect(1, err="cell 2, line 1: FAILS: check m <= 3 kg")
    assert "1 result; 1 check FAILS" in result.err, result.err


def a_failed_assumption_is_status_1(folder):
    note = write(folder / "note.ipynb", notebook("m [kg] = 4\nassume m <= 3 kg"))
    whorl("run", note).expect(1, err="cell 1, line 2: FAILS: assume m <= 3 kg")


def a_note_in_error_is_status_2_and_runs_to_its_end(folder):
    note = notebook(
        "m [kg] = 4\nt [s] = m", prose("text"), "y = x_1 + 1", "b [kg] = 2\ncheck b <= 1 kg"
    )
    path = write(folder / "note.ipynb", note)
    out = folder / "out.ipynb"
    result = whorl("run", path, "--json", folder / "r.json", "--out", out).expect(2)
    assert "cell 1, line 2, column 9" in result.err, result.err
    assert "cell 3, line 1" in result.err and "x_1" in result.err, result.err
    errors = json.loads((folder / "r.json").read_text(encoding="utf-8"))["errors"]
    assert [(e["cell"], e["line"]) for e in errors] == [(1, 2), (3, 1)], errors
    record = json.loads((folder / "r.json").read_text(encoding="utf-8"))
    assert "b" in record["definitions"], "the last cell was not run"
    assert not out.exists(), "a note in error was written"
    assert f"{out} was not written" in result.err, result.err


def cells_in_java_or_for_other_kernels_are_errors(folder):
    note = write(folder / "note.ipynb", notebook("%%java\nint x = 1;", "%%html\n<b>"))
    result = whorl("run", "--no-java", note).expect(2, err="Cells in Java are refused here")
    assert "This cell is written for another kernel" in result.err, result.err


def a_plain_sheet_is_one_cell(folder):
    sheet = folder / "ω.whorl"
    sheet.write_bytes("\ufeffm [kg] = 4\r\nF [N] = m * g_n\r\n".encode("utf-8"))
    whorl("run", sheet, "--out", folder / "o.ipynb", env={"LC_ALL": "C"}).expect(0, out="F")
    executed = read(folder / "o.ipynb")
    assert executed["metadata"]["kernelspec"]["language"] == "whorl", executed
    assert "".join(executed["cells"][0]["source"]) == "m [kg] = 4\r\nF [N] = m * g_n\r\n"


def results_that_cannot_be_written_are_status_3_and_leave_nothing(folder):
    note = write(folder / "note.ipynb", notebook("m [kg] = 4"))
    whorl("run", note, "--out", folder / "no" / "o.ipynb").expect(3, err="there is no folder")
    whorl("run", note, "--out", folder / "o.html").expect(3, err="must end in .ipynb")
    whorl("run", note, "--json", folder).expect(3, err="is a folder")
    assert sorted(p.name for p in folder.iterdir()) == ["note.ipynb"], list(folder.iterdir())
    full = pathlib.Path("/dev/full")
    if full.exists():
        whorl("run", note, "--json", full).expect(3, err="the disk is full")
        with full.open("wb") as stream:
            whorl("run", note, stdout=stream).expect(3)


def a_recheck_finds_what_changed(folder):
    path = write(folder / "note.ipynb", notebook(*FLYWHEEL))
    whorl("recheck", path).expect(1, out="cell 2: no results are stored")
    whorl("run", path, "--out", path).expect(0)
    stored = read(path)

    def changed(change):
        note = copy.deepcopy(stored)
        change(note)
        return whorl("recheck", write(folder / "changed.ipynb", note))

    def definition(note, name):
        return next(r["definitions"] for r in records(note) if name in r["definitions"])[name]

    def a_little(factor):
        def change(note):
            definition(note, "E")["si"] *= factor

        return change

    changed(a_little(1 + 1e-12)).expect(0)
    changed(a_little(1 + 1e-8)).expect(1, out="cell 3: E is ")
    changed(lambda note: definition(note, "m").update(kind="force")).expect(1, out="m is of the kind")
    changed(lambda note: note["cells"][1]["source"].append("z = 1")).expect(1, out="z is 1")
    changed(lambda note: note["cells"][2]["source"].pop()).expect(2)
    last = lambda note: list(records(note))[-1]["checks"][0]
    changed(lambda note: last(note).update(holds=False)).expect(1, out="stored: FAILS")
    changed(lambda note: list(records(note))[0].update(definitions=7)).expect(
        1, out="cannot be read"
    )


# ---- the demo notes ------------------------------------------------------------------------------


def demos_run_recheck_and_keep_their_bytes(folder):
    assert DEMOS, "there are no demo notes"
    for demo in DEMOS:
        before = hashlib.sha256(demo.read_bytes()).hexdigest()
        out = folder / demo.name
        result = whorl("run", demo, "--out", out, "--json", folder / "r.json")
        record = json.loads((folder / "r.json").read_text(encoding="utf-8"))
        verdicts = record["checks"] + record["assumptions"]
        result.expect(0 if all(verdict["holds"] for verdict in verdicts) else 1)
        assert record["definitions"] and not record["errors"], demo.name
        assert hashlib.sha256(demo.read_bytes()).hexdigest() == before, f"{demo.name} changed"
        assert without_results(read(out)) == without_results(read(demo)), demo.name
        whorl("recheck", out, "--java").expect(result.status, out="All agrees")
        whorl("recheck", demo, "--java").expect(result.status, out="All agrees")


CHECKS = [
    the_launcher_tells_its_version,
    the_launcher_works_through_links_from_any_folder,
    several_starts_at_once_do_not_disturb_each_other,
    a_damaged_archive_of_classes_does_not_matter,
    an_old_or_missing_jdk_is_named,
    wrong_commands_are_explained,
    files_that_are_no_notes_are_refused,
    a_note_is_printed_and_summed_up,
    results_are_written_at_full_precision,
    only_outputs_change_in_an_executed_note,
    inputs_can_be_set_for_a_run,
    a_failed_check_is_status_1,
    a_failed_assumption_is_status_1,
    a_note_in_error_is_status_2_and_runs_to_its_end,
    cells_in_java_or_for_other_kernels_are_errors,
    a_plain_sheet_is_one_cell,
    results_that_cannot_be_written_are_status_3_and_leave_nothing,
    a_recheck_finds_what_changed,
    demos_run_recheck_and_keep_their_bytes,
]


if __name__ == "__main__":
    sys.exit(run(__doc__, CHECKS))
