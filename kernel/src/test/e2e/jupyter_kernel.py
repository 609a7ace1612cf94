"""A kernel as a front end sees it, on top of jupyter_client."""

import re
import time

import zmq
from jupyter_client import KernelManager

from checks import STEPS

# A guard against hanging; nothing here takes long.
PATIENCE = 60


class Answer:
    """What came of one request: its reply, and what was published for it."""

    def __init__(self):
        self.reply = None
        self.published = []
        self.idle = False

    @property
    def status(self):
        return self.reply["content"]["status"]

    @property
    def content(self):
        return self.reply["content"]

    def of(self, *types):
        """The contents of the published messages of some types."""
        return [m["content"] for m in self.published if m["msg_type"] in types]

    def printed(self, name="stdout"):
        return "".join(c["text"] for c in self.of("stream") if c["name"] == name)

    def shown(self):
        """What the cell itself shows, as text."""
        return "\n".join(c["data"]["text/plain"] for c in self.of("display_data", "execute_result"))

    def displayed(self):
        """The outputs that can be shown anew, by id."""
        return {
            c["transient"]["display_id"]: c
            for c in self.of("display_data")
            if "display_id" in c.get("transient", {})
        }

    def updated(self):
        """The outputs that were shown anew, by id."""
        return {c["transient"]["display_id"]: c for c in self.of("update_display_data")}

    def succeeded(self):
        """Requires success."""
        assert self.status == "ok", self.content
        return self

    def failed(self, *words):
        """Requires an error whose text holds some words."""
        assert self.status == "error", self.content
        error = self.of("error")
        assert len(error) == 1, error
        said = without_colours("\n".join([error[0]["evalue"], *error[0]["traceback"]]))
        for word in words:
            assert word in said, f"no “{word}” in {said}"
        return self


def without_colours(text):
    return re.sub(r"\x1b\[[0-9;]*m", "", text)


def results(content):
    """The results recorded in an output: values of definitions, and verdicts of checks."""
    record = content["data"].get(STEPS, {})
    values = {name: d["si"] for name, d in record.get("definitions", {}).items()}
    verdicts = {c["text"]: c["holds"] for c in record.get("checks", [])}
    return values, verdicts


class Kernel:
    """A kernel that runs; to be used in a with statement."""

    def __init__(self, name="whorl", **popen):
        self.manager = KernelManager(kernel_name=name)
        self.popen = popen

    def __enter__(self):
        self.manager.start_kernel(**self.popen)
        self.connect()
        return self

    def __exit__(self, *_):
        self.client.stop_channels()
        self.manager.shutdown_kernel(now=True)

    def connect(self):
        self.answers = {}
        self.client = self.manager.client()
        self.client.start_channels()
        self.client.wait_for_ready(timeout=PATIENCE)

    def restart(self):
        self.client.stop_channels()
        self.manager.restart_kernel()
        self.connect()

    @property
    def process(self):
        return self.manager.provisioner.process

    def send(self, kind, content, metadata=None, channel="shell"):
        """Sends a request and does not wait."""
        message = self.client.session.msg(kind, content, metadata=metadata)
        getattr(self.client, f"{channel}_channel").send(message)
        self.answers[message["header"]["msg_id"]] = Answer()
        return message["header"]["msg_id"]

    def execute(self, code, cell=None, deleted=(), **options):
        """Sends a cell as JupyterLab does, or without an id as a console does."""
        metadata = {} if cell is None else {"cellId": cell, "deletedCells": list(deleted)}
        content = {
            "code": code,
            "silent": False,
            "store_history": True,
            "user_expressions": {},
            "allow_stdin": False,
            "stop_on_error": True,
            **options,
        }
        return self.send("execute_request", content, metadata)

    def run(self, code, cell=None, deleted=(), **options):
        return self.wait(self.execute(code, cell, deleted, **options))

    def ask(self, kind, channel="shell", **content):
        """The content of the reply to another request."""
        return self.wait(self.send(kind, content, channel=channel), channel).content

    def interrupt(self):
        return self.ask("interrupt_request", channel="control")

    def wait(self, request, channel="shell"):
        """The whole answer to a request."""
        answer = self.answers[request]
        end = time.monotonic() + PATIENCE
        while not (answer.reply and answer.idle):
            assert time.monotonic() < end, f"no answer: {vars(answer)}"
            self.receive(channel)
        return answer

    def wait_for_published(self, request, of_type):
        """Waits until the request published a message of a type; it may still run."""
        answer = self.answers[request]
        end = time.monotonic() + PATIENCE
        while not answer.of(of_type):
            assert time.monotonic() < end, f"no {of_type}: {vars(answer)}"
            self.receive("shell")
        return answer

    def receive(self, channel):
        """Waits a moment for messages, and takes them in."""
        sources = {name: getattr(self.client, f"{name}_channel") for name in ("iopub", channel)}
        poller = zmq.Poller()
        for source in sources.values():
            poller.register(source.socket, zmq.POLLIN)
        poller.poll(100)
        for name, source in sources.items():
            while source.msg_ready():
                message = source.get_msg(timeout=0)
                answer = self.answers.get(message["parent_header"].get("msg_id"))
                if answer is None:
                    continue
                if name == channel:
                    answer.reply = message
                else:
                    answer.published.append(message)
                    state = message["content"].get("execution_state")
                    answer.idle = answer.idle or state == "idle"


class Page:
    """A notebook page beside a kernel: cells with ids, and the outputs that a front end shows."""

    def __init__(self, kernel):
        self.kernel = kernel
        self.cells = {}
        self.outputs = {}

    def run(self, cell, code, deleted=()):
        for gone in deleted:
            del self.cells[gone], self.outputs[gone]
        self.cells[cell] = code
        answer = self.kernel.run(code, cell, deleted)
        self.outputs[cell] = answer.displayed()
        for id, content in answer.updated().items():
            for outputs in self.outputs.values():
                if id in outputs:
                    outputs[id] = content
        return answer

    def text(self, cell):
        """What stands below a cell."""
        return "\n".join(c["data"]["text/plain"] for c in self.outputs[cell].values())

    def steps(self, cell):
        """The steps below a cell, without what was said of the run that made them: changes
        elsewhere stand below the last rule, similar names are those of the moment."""
        table = self.text(cell).rpartition("─")[0]
        lines = (" ".join(line.split()) for line in table.splitlines())
        return [line for line in lines if not line.startswith(("near", "─"))]

    def results(self):
        """All values and verdicts on the page."""
        values, verdicts = {}, {}
        for outputs in self.outputs.values():
            for content in outputs.values():
                more_values, more_verdicts = results(content)
                values.update(more_values)
                verdicts.update(more_verdicts)
        return values, verdicts
