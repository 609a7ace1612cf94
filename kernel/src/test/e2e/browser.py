#!/usr/bin/env python3
"""End-to-end checks in JupyterLab, started by whorl lab and driven in Chromium as a user would.

Runs in the environment of whorl lab, with requirements.txt. Screenshots are kept in
kernel/target/screenshots. Stops at the first check that fails.
"""

import os
import pathlib
import shutil
import signal
import socket
import subprocess
import sys
import tempfile
import time
import urllib.request

from playwright.sync_api import expect, sync_playwright

from checks import DEMOS, ROOT, STEPS, WHORL, notebook, read, run, write

SCREENSHOTS = ROOT / "kernel" / "target" / "screenshots"
# In milliseconds. A guard against hanging: a machine of two cores may be busy.
PATIENCE = 60_000
WHORL_KERNEL = {"kernelspec": {"display_name": "Whorl", "language": "whorl", "name": "whorl"}}

FLYWHEEL = [
    "m [kg] = 412   # weighed\nD [mm] = 900\nn [rpm] = 6000",
    "I [kg·m²] = 1/2 * m * (D/2)^2\nE [MJ] = 1/2 * I * n^2",
    "check E <= 10 MJ   # containment rating",
    "v [m/s] = n * D/2",
]


def results(note):
    """The results recorded in a notebook."""
    outputs = [output for cell in note["cells"] for output in cell.get("outputs", [])]
    return [o["data"][STEPS] for o in outputs if STEPS in o.get("data", {})]


class Lab:
    """JupyterLab on a folder of its own, and a browser beside it."""

    def __enter__(self):
        self.home = pathlib.Path(tempfile.mkdtemp(prefix="whorl-lab-"))
        self.notes = self.home / "notes"
        self.notes.mkdir()
        write(self.notes / "first.ipynb", notebook("x = 1", **WHORL_KERNEL))
        with socket.socket() as free:
            free.bind(("127.0.0.1", 0))
            self.port = free.getsockname()[1]
        own = {
            "HOME": str(self.home),
            "WHORL_LAB": sys.prefix,
            **{f"JUPYTER_{w}_DIR": str(self.home / w) for w in ("CONFIG", "DATA", "RUNTIME")},
        }
        self.log = (self.home / "log").open("w")
        self.server = subprocess.Popen(
            [
                WHORL,
                "lab",
                self.notes / "first.ipynb",
                "--no-browser",
                f"--port={self.port}",
                "--allow-root",
                "--IdentityProvider.token=",
                "--ServerApp.disable_check_xsrf=True",
                "--LabApp.expose_app_in_browser=True",
            ],
            env={**os.environ, **own},
            stdin=subprocess.DEVNULL,
            stdout=self.log,
            stderr=self.log,
        )
        self.playwright = sync_playwright().start()
        self.browser = self.playwright.chromium.launch(
            executable_path=shutil.which("chromium"),
            args=[
                "--no-sandbox",
                "--disable-gpu",
                "--disable-background-networking",
                "--disable-component-update",
                "--disable-sync",
            ],
        )
        self.wait_for_server()
        return self

    def __exit__(self, *_):
        self.browser.close()
        self.playwright.stop()
        # As Ctrl-C does.
        self.server.send_signal(signal.SIGINT)
        self.server.wait(timeout=PATIENCE / 1000)
        self.log.close()
        shutil.rmtree(self.home, ignore_errors=True)

    def wait_for_server(self):
        end = time.monotonic() + PATIENCE / 1000
        while True:
            try:
                with urllib.request.urlopen(f"http://127.0.0.1:{self.port}/api", timeout=5):
                    return
            except OSError:
                said = (self.home / "log").read_text()
                assert self.server.poll() is None and time.monotonic() < end, said
                time.sleep(0.2)

    def open(self, name, *cells):
        """Opens a note of some cells, or one that stands in the folder already."""
        if cells:
            write(self.notes / name, notebook(*cells, **WHORL_KERNEL))
        return Note(self, name)


class Note:
    """A note that is open in the browser; to be used in a with statement."""

    def __init__(self, lab, name):
        self.lab = lab
        self.name = name

    def __enter__(self):
        self.page = self.lab.browser.new_page(viewport={"width": 1280, "height": 900})
        self.page.set_default_timeout(PATIENCE)
        expect.set_options(timeout=PATIENCE)
        self.page.goto(f"http://127.0.0.1:{self.lab.port}/lab/tree/{self.name}?reset")
        self.page.locator(".jp-CodeCell").first.wait_for()
        self.idle()
        self.command("apputils:change-theme", theme="JupyterLab Light")
        if self.page.locator("#jp-left-stack").is_visible():
            self.command("application:toggle-left-area")
        return self

    def __exit__(self, *_):
        self.command("docmanager:save")
        self.command("kernelmenu:shutdown")
        self.page.close()

    def command(self, id, **arguments):
        self.page.evaluate(
            "([id, args]) => { window.jupyterapp.commands.execute(id, args); }", [id, arguments]
        )

    def idle(self):
        """Waits until no cell runs and the kernel is idle."""
        self.page.wait_for_function(
            """() => {
              const panel = window.jupyterapp.shell.currentWidget;
              const kernel = panel?.sessionContext?.session?.kernel;
              const prompts = [...document.querySelectorAll('.jp-InputPrompt')];
              return kernel?.status === 'idle' && kernel?.connectionStatus === 'connected' &&
                !prompts.some(prompt => prompt.textContent.includes('*'));
            }"""
        )

    def run_all(self):
        self.command("notebook:run-all-cells")
        self.page.wait_for_timeout(300)
        self.idle()

    def cell(self, index):
        return self.page.locator(".jp-CodeCell").nth(index)

    def output(self, index):
        return self.cell(index).locator(".jp-OutputArea").first

    def prompt(self, index):
        return self.cell(index).locator(".jp-InputPrompt").inner_text()

    def type(self, index, code):
        """Writes over the text of a cell."""
        self.cell(index).locator(".cm-content").click()
        self.page.keyboard.press("Control+a")
        self.page.keyboard.insert_text(code)

    def choices(self):
        """What completion offers; presses Tab, again where JupyterLab did not wait for it."""
        items = self.page.locator(".jp-Completer-item")
        for _ in range(10):
            self.page.keyboard.press("Tab")
            for _ in range(20):
                if items.first.is_visible():
                    return items
                self.page.wait_for_timeout(100)
        raise AssertionError("nothing is offered")

    def run_cell(self, index, code):
        self.type(index, code)
        self.page.keyboard.press("Control+Enter")

    def select(self, index):
        """Selects a cell, outside its text."""
        self.cell(index).locator(".jp-InputPrompt").click()

    def errors(self):
        """How many errors are shown."""
        return self.page.locator("[data-mime-type='application/vnd.jupyter.error']").count()

    def zoom(self, factor):
        """Makes everything larger, as a browser does."""
        self.page.evaluate("factor => { document.body.style.zoom = factor; }", factor)
        self.page.evaluate("window.dispatchEvent(new Event('resize'))")

    def screenshot(self, name):
        """Keeps a picture of what is seen."""
        SCREENSHOTS.mkdir(parents=True, exist_ok=True)
        self.page.wait_for_timeout(500)
        self.page.screenshot(path=SCREENSHOTS / f"{name}.png")

    def saved(self):
        self.command("docmanager:save")
        self.page.wait_for_timeout(1000)
        return read(self.lab.notes / self.name)


LAB = None


def a_demo_note_runs_whole(folder):
    demo = DEMOS[0]
    shutil.copy(demo, LAB.notes / demo.name)
    with LAB.open(demo.name) as note:
        note.run_all()
        assert note.errors() == 0, "an error is shown"
        note.screenshot("demo-light")
        note.command("apputils:change-theme", theme="JupyterLab Dark")
        note.screenshot("demo-dark")
        fresh, stored = results(note.saved()), results(read(demo))
        assert stored and fresh == stored, "the results are not those that were stored"


def a_change_is_seen_in_cells_below_without_running_them(folder):
    with LAB.open("live.ipynb", *FLYWHEEL) as note:
        note.run_all()
        expect(note.output(2)).to_contain_text("holds")
        expect(note.output(1)).to_contain_text("8.234")
        note.screenshot("live-before")
        prompts = [note.prompt(index) for index in range(4)]
        note.run_cell(0, FLYWHEEL[0].replace("6000", "7000"))
        # E = 8.234 MJ (7000/6000)² = 11.21 MJ
        expect(note.output(1)).to_contain_text("11.21")
        expect(note.output(2)).to_contain_text("FAILS")
        expect(note.output(0)).to_contain_text("FAILS")
        note.idle()
        assert [note.prompt(index) for index in range(1, 4)] == prompts[1:], "they were run"
        assert note.prompt(0) != prompts[0], "the changed cell was not run"
        note.screenshot("live-after")
        for theme in ("Light", "Dark"):
            note.command("apputils:change-theme", theme=f"JupyterLab {theme}")
            note.page.set_viewport_size({"width": 700, "height": 900})
            note.screenshot(f"live-narrow-{theme.lower()}")
            note.page.set_viewport_size({"width": 1280, "height": 900})
            note.zoom(2)
            note.screenshot(f"live-zoom-200-{theme.lower()}")
            note.zoom(1)
        saved = note.saved()
        values = {n: d["value"] for r in results(saved) for n, d in r["definitions"].items()}
        assert abs(values["E"] - 11.207) < 1e-3, "the refreshed result was not saved"
        assert not any("transient" in o for c in saved["cells"] for o in c["outputs"])


def a_deleted_cell_takes_its_names_along_until_it_comes_back(folder):
    with LAB.open("delete.ipynb", *FLYWHEEL) as note:
        note.run_all()
        note.select(1)
        note.command("notebook:delete-cell")
        note.run_cell(2, FLYWHEEL[3] + " # again")
        expect(note.output(1)).to_contain_text("waits for E")
        note.screenshot("deleted")
        note.command("notebook:undo-cell-action")
        expect(note.page.locator(".jp-CodeCell")).to_have_count(4)
        note.run_cell(1, FLYWHEEL[1])
        expect(note.output(2)).to_contain_text("holds")


def units_and_symbols_are_completed(folder):
    with LAB.open("complete.ipynb", "n [rpm] = 6000", "x = 1") as note:
        note.run_all()
        note.type(1, "omega_max = 5 rad/mi")
        minute = note.choices().filter(has=note.page.get_by_text("min", exact=True))
        note.screenshot("completion")
        minute.click()
        expect(note.cell(1).locator(".cm-content")).to_have_text("omega_max = 5 rad/min")
        note.type(1, "x = \\alph")
        note.choices().first.click()
        expect(note.cell(1).locator(".cm-content")).to_have_text("x = α")


def a_name_is_explained_where_it_stands(folder):
    with LAB.open("inspect.ipynb", "n [rpm] = 6000   # rated speed", "y = n") as note:
        note.run_all()
        note.type(1, "y = n")
        note.page.keyboard.press("Shift+Tab")
        expect(note.page.locator(".jp-Tooltip")).to_contain_text("angular velocity")
        note.screenshot("inspection")


def an_error_has_its_caret_below_its_place(folder):
    with LAB.open("error.ipynb", "n [rpm] = 6000", "t [s] = 2*n") as note:
        note.run_all()
        said = note.output(1).locator("pre").inner_text().splitlines()
        assert said[0].startswith("t is declared as a time"), said
        line = next(i for i, text in enumerate(said) if "t [s] = 2*n" in text)
        caret = said[line + 1]
        assert caret.index("^") == said[line].index("2*n"), said
        note.screenshot("error-light")
        note.command("apputils:change-theme", theme="JupyterLab Dark")
        note.screenshot("error-dark")


def an_endless_loop_is_interrupted(folder):
    with LAB.open("loop.ipynb", "n [rpm] = 6000", "x = 1", "y = 2*n") as note:
        note.run_cell(0, "n [rpm] = 6000")
        note.idle()
        note.run_cell(1, "%%java\nwhile (true) {}")
        expect(note.cell(1).locator(".jp-InputPrompt")).to_contain_text("*")
        note.page.wait_for_timeout(1500)
        note.command("notebook:interrupt-kernel")
        expect(note.output(1)).to_contain_text("nterrupted")
        note.idle()
        note.screenshot("interrupted")
        note.run_cell(2, "y = 2*n")
        # 2 · 6000 rpm in rad/s
        expect(note.output(2)).to_contain_text("rpm")


def after_a_restart_the_page_is_as_it_was(folder):
    with LAB.open("restart.ipynb", *FLYWHEEL) as note:
        note.run_all()
        note.run_cell(0, FLYWHEEL[0].replace("6000", "7000"))
        expect(note.output(2)).to_contain_text("FAILS")
        before = results(note.saved())
        note.command("notebook:restart-run-all")
        note.page.locator(".jp-Dialog button.jp-mod-accept").click()
        expect(note.cell(0).locator(".jp-InputPrompt")).to_contain_text("[1]")
        expect(note.cell(3).locator(".jp-InputPrompt")).to_contain_text("[4]")
        note.idle()
        expect(note.output(2)).to_contain_text("FAILS")
        assert results(note.saved()) == before, "it is another page"


def java_asks_for_a_line(folder):
    java = '%%java\nString name = new java.util.Scanner(System.in).nextLine();\nname + "!"'
    with LAB.open("ask.ipynb", java) as note:
        note.run_cell(0, java)
        note.page.locator(".jp-Stdin-input").fill("rotor")
        note.page.locator(".jp-Stdin-input").press("Enter")
        expect(note.output(0)).to_contain_text("rotor!")


def a_note_from_elsewhere_is_shown_without_being_run(folder):
    demo = read(DEMOS[0])
    demo["cells"][0]["source"] = "# A copy that this machine never ran"
    for cell in demo["cells"]:
        for output in cell.get("outputs", []):
            if "text/html" in output.get("data", {}):
                html = "".join(output["data"]["text/html"])
                output["data"]["text/html"] = html + "<p>changed</p>"
    write(LAB.notes / "elsewhere.ipynb", demo)
    with LAB.open("elsewhere.ipynb") as note:
        expect(note.page.locator(".jp-OutputArea-output table").first).to_be_visible()
        note.page.locator(".jp-OutputArea-output table").first.scroll_into_view_if_needed()
        note.screenshot("untrusted")


CHECKS = [
    a_demo_note_runs_whole,
    a_change_is_seen_in_cells_below_without_running_them,
    a_deleted_cell_takes_its_names_along_until_it_comes_back,
    units_and_symbols_are_completed,
    a_name_is_explained_where_it_stands,
    an_error_has_its_caret_below_its_place,
    an_endless_loop_is_interrupted,
    after_a_restart_the_page_is_as_it_was,
    java_asks_for_a_line,
    a_note_from_elsewhere_is_shown_without_being_run,
]


def main():
    global LAB
    with Lab() as LAB:
        return run(__doc__, CHECKS)


if __name__ == "__main__":
    sys.exit(main())
