"""What the suites of end-to-end checks share: starting the command, notebooks, counting.

A check is a function of a fresh folder. Its name says what must hold; it raises where it does not.
"""

import argparse
import json
import os
import pathlib
import subprocess
import tempfile

ROOT = pathlib.Path(__file__).resolve().parents[4]
WHORL = ROOT / "kernel" / "bin" / "whorl"
DEMOS = sorted((ROOT / "notebooks-demo").glob("*.ipynb"))
STEPS = "application/x-whorl-steps+json"


class Result:
    """What a start of the command came to."""

    def __init__(self, process):
        self.status = process.returncode
        self.out = process.stdout.decode("utf-8")
        self.err = process.stderr.decode("utf-8")

    def expect(self, status, err=None, out=None):
        """Requires an exit status, and words in what was printed."""
        said = f"\n--- standard output\n{self.out}\n--- standard error\n{self.err}"
        assert self.status == status, f"exit status {self.status}, expected {status}{said}"
        assert err is None or err in self.err, f"no “{err}” on standard error{said}"
        assert out is None or out in self.out, f"no “{out}” on standard output{said}"
        return self


def whorl(*arguments, command=WHORL, cwd=None, env=None, stdout=subprocess.PIPE):
    process = subprocess.run(
        [str(word) for word in (command, *arguments)],
        cwd=cwd,
        env={**os.environ, **(env or {})},
        stdin=subprocess.DEVNULL,
        stdout=stdout,
        stderr=subprocess.PIPE,
        timeout=600,
    )
    process.stdout = process.stdout or b""
    return Result(process)


def notebook(*cells, **metadata):
    """A notebook of the given cells: text of a code cell, or a whole cell."""
    return {
        "cells": [cell if isinstance(cell, dict) else code(cell) for cell in cells],
        "metadata": metadata,
        "nbformat": 4,
        "nbformat_minor": 4,
    }


def code(text):
    return {
        "cell_type": "code",
        "execution_count": None,
        "metadata": {},
        "outputs": [],
        "source": text.splitlines(True),
    }


def prose(text):
    return {"cell_type": "markdown", "metadata": {}, "source": text}


def write(path, note):
    """Writes a notebook as Jupyter does."""
    text = json.dumps(note, indent=1, sort_keys=True, ensure_ascii=False)
    path.write_text(text + "\n", encoding="utf-8")
    return path


def read(path):
    return json.loads(path.read_text(encoding="utf-8"))


def run(description, checks):
    """Runs the checks up to the first that fails; returns the exit status of the suite."""
    parser = argparse.ArgumentParser(description=description)
    parser.add_argument("--count-to", type=pathlib.Path, help="write '<passed> <failed>' here")
    parser.add_argument("--only", default="", metavar="WORDS", help="checks with these in the name")
    arguments = parser.parse_args()
    passed = failed = 0
    whorl("--version").expect(0)  # builds, if nothing is built yet
    for check in checks:
        name = check.__name__.replace("_", " ")
        if arguments.only not in name:
            continue
        with tempfile.TemporaryDirectory() as folder:
            try:
                check(pathlib.Path(folder).resolve())
            except Exception as problem:  # any failure of a check is reported as one
                failed += 1
                print(f"FAIL  {name}: {type(problem).__name__}: {problem}"[:4000], flush=True)
                break
        passed += 1
        print(f"ok    {name}", flush=True)
    print(f"{passed} passed, {failed} failed")
    if arguments.count_to:
        arguments.count_to.write_text(f"{passed} {failed}\n")
    return 1 if failed else 0
