#!/usr/bin/env python3
"""End-to-end checks of whorl install and of how whorl lab makes its environment, without a network.

Needs Python 3.9 with venv and nothing else. Stops at the first check that fails.
"""

import json
import os
import pathlib
import shutil
import subprocess
import sys

from checks import WHORL, run, whorl

KERNELS = {"whorl": "Whorl", "whorl-java": "Java (Whorl)"}
NOBODY = 65534


def spec(kernels, name="whorl"):
    return json.loads((kernels / name / "kernel.json").read_text(encoding="utf-8"))


def content(folder):
    """Every file below a folder with its bytes."""
    return {path: path.read_bytes() for path in folder.rglob("*") if path.is_file()}


# ---- install -------------------------------------------------------------------------------------


def both_kernels_are_installed_for_the_user(folder):
    kernels = folder / "data" / "kernels"
    result = whorl("install", env={"JUPYTER_DATA_DIR": str(folder / "data")}).expect(0)
    assert sorted(path.name for path in kernels.iterdir()) == sorted(KERNELS)
    for name, title in KERNELS.items():
        assert f"{title}, in {kernels / name}" in result.out, result.out
        told = spec(kernels, name)
        assert (told["display_name"], told["interrupt_mode"]) == (title, "message"), told
        words = told["argv"]
        assert words[-1] == "{connection_file}" and ("--java" in words) == (name != "whorl"), words
        for logo in ("logo-32x32.png", "logo-64x64.png"):
            assert (kernels / name / logo).read_bytes().startswith(b"\x89PNG"), logo
        assert "<svg" in (kernels / name / "logo-svg.svg").read_text(encoding="utf-8")
    assert [spec(kernels, name)["language"] for name in KERNELS] == ["whorl", "java"]


def jupyters_folder_is_found_without_jupyter(folder):
    own = {"JUPYTER_DATA_DIR": "", "HOME": str(folder), "XDG_DATA_HOME": str(folder / "x")}
    place = "Library/Jupyter" if sys.platform == "darwin" else "x/jupyter"
    whorl("install", "--user", env=own).expect(0, out=str(folder / place / "kernels" / "whorl"))


def an_installed_kernel_is_whole_and_quick(folder):
    whorl("install", "--prefix", folder, "--name", "mine", "--jvm-option=-Xmx777m").expect(0)
    kernels = folder / "share" / "jupyter" / "kernels"
    assert sorted(path.name for path in kernels.iterdir()) == ["mine", "mine-java"]
    for name in ("mine", "mine-java"):
        words = spec(kernels, name)["argv"]
        assert "-Xmx777m" in words, words
        start = words[: words.index("-jar") + 2]
        outside = [word for word in start[1:] if "/" in word and str(kernels / name) not in word]
        assert pathlib.Path(start[0]).is_absolute() and not outside, start
        said = subprocess.run([*start, "--version"], capture_output=True, timeout=60, check=True)
        assert said.stdout.startswith(b"whorl ") and said.stderr == b"", said
        # The JVM refuses to start with an archive that does not fit.
        subprocess.run(
            ["-Xshare:on" if word == "-Xshare:auto" else word for word in start] + ["--version"],
            stdout=subprocess.DEVNULL,
            timeout=60,
            check=True,
        )


def a_failed_installation_leaves_what_was_there(folder):
    whorl("install", "--prefix", folder).expect(0)
    before = content(folder)
    java_kernel = folder / "share" / "jupyter" / "kernels" / "whorl-java"
    shutil.rmtree(java_kernel)
    java_kernel.write_text("in the way")
    result = whorl("install", "--prefix", folder).expect(3, err="cannot be written")
    assert result.out == "" and "Exception" not in result.err, result.err
    java_kernel.unlink()
    after = content(folder)
    assert after == {path: data for path, data in before.items() if java_kernel not in path.parents}


def places_that_cannot_be_written_are_refused(folder):
    file = folder / "file"
    file.write_text("")
    whorl("install", "--prefix", folder / "no").expect(3, err="no does not exist")
    whorl("install", "--prefix", file).expect(3, err="file is not a folder")
    whorl("install", "--prefix", folder, "--user").expect(3, err="--user")
    whorl("install", "--prefix", folder, "--name", "a b").expect(3, err="Jupyter allows letters")
    result = whorl("install", env={"JUPYTER_DATA_DIR": str(file)}).expect(3)
    assert f"whorl: {file} is not a folder" in result.err, result.err
    closed = folder / "closed"
    closed.mkdir()
    closed.chmod(0o555)
    other = {"user": NOBODY} if os.geteuid() == 0 else {}
    folder.chmod(0o755)
    denied = subprocess.run(
        [WHORL, "install", "--prefix", closed],
        capture_output=True,
        timeout=60,
        stdin=subprocess.DEVNULL,
        **other,
    )
    said = denied.stderr.decode("utf-8")
    assert denied.returncode == 3, denied
    assert said.endswith("cannot be written: there is no permission\n"), said
    assert list(closed.iterdir()) == [], list(closed.iterdir())


# ---- lab -----------------------------------------------------------------------------------------


def python_that(folder, name, body):
    script = folder / name
    script.write_text("#!/bin/sh\n" + body)
    script.chmod(0o755)
    return str(script)


def a_python_that_will_not_do_is_named(folder):
    def lab(python):
        return whorl("lab", env={"WHORL_LAB": str(folder / "lab"), "WHORL_PYTHON": str(python)})

    need = "Python 3.9 or newer is needed for JupyterLab"
    lab(folder / "none").expect(3, err=f"{need}, and there is no {folder / 'none'} on the PATH")
    old = python_that(folder, "old", '[ "$1" = -V ] && echo Python 3.6.8\n[ "$1" = -V ]\n')
    lab(old).expect(3, err=f"{need}, but {old} is Python 3.6.8")
    bare = python_that(folder, "bare", 'case $2 in *venv*) exit 1 ;; esac\n')
    lab(bare).expect(3, err="install python3-venv")
    assert not (folder / "lab").exists(), "nothing was made"


def a_folder_of_something_else_is_left_alone(folder):
    (folder / "mine.txt").write_text("mine")
    whorl("lab", env={"WHORL_LAB": str(folder)}).expect(3, err=f"{folder} holds something else")
    assert [path.name for path in folder.iterdir()] == ["mine.txt"]


def a_note_that_is_not_there_is_named(folder):
    lab = {"WHORL_LAB": str(folder / "lab")}
    note = folder / "no.ipynb"
    whorl("lab", note, env=lab).expect(3, err=f"there is no file {note}")
    whorl("lab", "--help", env=lab).expect(0, out="WHORL_LAB")
    assert not (folder / "lab").exists(), "nothing was made"


def without_a_network_this_is_said_and_the_half_made_is_made_again(folder):
    lab = folder / "lab"
    offline = {
        "WHORL_LAB": str(lab),
        "PIP_INDEX_URL": "http://127.0.0.1:9/",
        "PIP_RETRIES": "0",
        "PIP_NO_CACHE_DIR": "1",
        "TMPDIR": str(folder),
    }
    for _ in range(2):
        result = whorl("lab", env=offline).expect(3, err="a first start needs a network")
        assert "ERROR: " in result.err, "what pip said"
        assert (lab / "bin" / "python").exists() and (lab / "made-by-whorl").read_text() == ""
        (lab / "left over").write_text("")
    assert not (folder / "lab.lock").is_symlink(), "the lock was left"


CHECKS = [
    both_kernels_are_installed_for_the_user,
    jupyters_folder_is_found_without_jupyter,
    an_installed_kernel_is_whole_and_quick,
    a_failed_installation_leaves_what_was_there,
    places_that_cannot_be_written_are_refused,
    a_python_that_will_not_do_is_named,
    a_folder_of_something_else_is_left_alone,
    a_note_that_is_not_there_is_named,
    without_a_network_this_is_said_and_the_half_made_is_made_again,
]

if __name__ == "__main__":
    sys.exit(run(__doc__, CHECKS))
