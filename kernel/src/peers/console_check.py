"""The terminal client, fed line by line: output, an error, the line after the error, a result."""
import os
import subprocess
import sys
import threading

STEPS = [
    ('System.out.println("hello, world");', "hello, world"),
    ('throw new IllegalStateException("the bias ran away");', "the bias ran away"),
    ("mV(650).times(2)", "1.3 V"),
    ("int five = 5;", None),
    ("five + 1", "6"),
]


class Screen:
    """All that the program has printed, with a way to wait for a text."""

    def __init__(self, process):
        self.text = ""
        self.change = threading.Condition()
        threading.Thread(target=self._read, args=(process.stdout.fileno(),), daemon=True).start()

    def _read(self, fd):
        while piece := os.read(fd, 65536):
            with self.change:
                self.text += piece.decode("utf-8", "replace")
                self.change.notify_all()

    def wait_for(self, wanted, start, seconds=30):
        with self.change:
            return self.change.wait_for(lambda: wanted in self.text[start:], timeout=seconds)


def problems(setup):
    process = subprocess.Popen(
        [sys.executable, "-m", "jupyter_console", "--kernel", setup.kernel, "--simple-prompt",
         "--JupyterConsoleApp.confirm_exit=False"],
        cwd=setup.scratch, stdin=subprocess.PIPE, stdout=subprocess.PIPE, stderr=subprocess.STDOUT,
        env={**os.environ, "JUPYTER_CONSOLE_TEST": "1", "PYTHONUNBUFFERED": "1"})
    screen = Screen(process)
    found = []
    try:
        if not screen.wait_for("In [1]:", 0):
            return [f"no prompt: {screen.text[-1000:]}"]
        for number, (line, answer) in enumerate(STEPS, start=1):
            start = len(screen.text)
            process.stdin.write(line.encode() + b"\n")
            process.stdin.flush()
            if not screen.wait_for(f"In [{number + 1}]:", start):
                found.append(f"no prompt after {line!r}: {screen.text[start:][-1000:]}")
                break
            if answer is not None and answer not in screen.text[start:]:
                found.append(f"{line!r} did not show {answer!r}: {screen.text[start:][-1000:]}")
    finally:
        process.stdin.close()
        try:
            process.wait(timeout=15)
        except subprocess.TimeoutExpired:
            process.kill()
            found.append("the console did not end within 15 s of its end of input")
    return found
