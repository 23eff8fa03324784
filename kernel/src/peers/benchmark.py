#!/usr/bin/python3
"""Times the kernel as a whole process through the reference client, beside the reference implementation's own kernel.

    benchmark.py --jar kernel/target/pinchoff.jar [--starts 20] [--rounds 200] [--java java]

Both kernels are measured in turn in one run, so that the ratios mean something on a noisy machine. Prints medians, and
the ratio to the reference kernel. Debian packages: python3-jupyter-client python3-ipykernel.
"""
import argparse
import os
import shutil
import statistics
import subprocess
import sys
import tempfile
import time
from pathlib import Path

import jupyter_client

OURS, REFERENCE = "pinchoff", "python3"
CELLS = {  # the same work in both languages
    "trivial": {OURS: "1 + 1", REFERENCE: "1 + 1"},
    "one write": {OURS: 'System.out.print("x".repeat(1_000_000))', REFERENCE: 'print("x" * 1_000_000, end="")'},
    "10 000 lines": {OURS: 'for (int i = 0; i < 10_000; i++) System.out.println("x".repeat(99));',
                     REFERENCE: 'for i in range(10_000): print("x" * 99)'},
}
COMPLETE = {OURS: "System.ou", REFERENCE: "import os; os.pa"}


def wait_idle(client, request, seconds=60):
    """Reads iopub until the request's idle; returns the messages that belong to it."""
    seen = []
    while True:
        message = client.get_iopub_msg(timeout=seconds)
        if message["parent_header"].get("msg_id") == request:
            seen.append(message)
            if message["msg_type"] == "status" and message["content"]["execution_state"] == "idle":
                return seen


def execute(client, code):
    """Seconds from the request to reply and idle."""
    begin = time.perf_counter()
    request = client.execute(code)
    while True:
        reply = client.get_shell_msg(timeout=60)
        if reply["parent_header"]["msg_id"] == request:
            break
    wait_idle(client, request)
    seconds = time.perf_counter() - begin
    if reply["content"]["status"] != "ok":
        raise SystemExit(f"benchmark: {code!r} failed: {reply['content'].get('evalue')}")
    return seconds


class Kernel:
    """A started kernel with its times: launch to kernel_info, launch to the first result."""

    def __init__(self, name, first=None):
        begin = time.perf_counter()
        self.manager = jupyter_client.KernelManager(kernel_name=name)
        self.manager.start_kernel()
        self.client = self.manager.client()
        self.client.start_channels()
        self.client.kernel_info()
        while True:  # the reply, however many requests it took
            try:
                if self.client.get_shell_msg(timeout=60)["msg_type"] == "kernel_info_reply":
                    break
            except Exception as e:
                raise SystemExit(f"benchmark: {name} does not answer: {e}") from e
        self.info = time.perf_counter() - begin
        if first:
            execute(self.client, first)
        self.result = time.perf_counter() - begin

    def stop(self):
        begin = time.perf_counter()
        self.client.shutdown()
        while self.manager.is_alive():
            time.sleep(0.005)
        seconds = time.perf_counter() - begin
        self.client.stop_channels()
        self.manager.cleanup_resources()
        return seconds


def median_ms(samples):
    return 1000 * statistics.median(samples)


def row(what, ours, reference, bound):
    ratio = median_ms(ours) / median_ms(reference)
    print(f"| {what} | {median_ms(ours):.0f} ms | {median_ms(reference):.0f} ms | {ratio:.2f} | {bound} |", flush=True)


def starts(count):
    info, result, stop = {OURS: [], REFERENCE: []}, {OURS: [], REFERENCE: []}, {OURS: [], REFERENCE: []}
    rich = {OURS: "um(2)", REFERENCE: "2"}
    for _ in range(count):
        for name in (OURS, REFERENCE):
            kernel = Kernel(name, rich[name])
            info[name].append(kernel.info)
            result[name].append(kernel.result)
            stop[name].append(kernel.stop())
    row("launch to kernel_info", info[OURS], info[REFERENCE], "0.6")
    row("launch to first library result", result[OURS], result[REFERENCE], "1.3 s")
    row("shutdown", stop[OURS], stop[REFERENCE], "0.5")


def warm(rounds):
    kernels = {name: Kernel(name) for name in (OURS, REFERENCE)}
    try:
        for name, kernel in kernels.items():
            for _ in range(30):
                execute(kernel.client, CELLS["trivial"][name])
        for what, bound, count in (("trivial", "2.0", rounds), ("one write", "1.2", 20), ("10 000 lines", "1.2", 20)):
            times = {name: [] for name in kernels}
            for _ in range(count):
                for name, kernel in kernels.items():
                    times[name].append(execute(kernel.client, CELLS[what][name]))
            row({"trivial": "warm trivial cell"}.get(what, "1 MB of output in " + what), times[OURS], times[REFERENCE], bound)
        times = {name: [] for name in kernels}
        for _ in range(rounds):
            for name, kernel in kernels.items():
                begin = time.perf_counter()
                request = kernel.client.complete(COMPLETE[name])
                kernel.client.get_shell_msg(timeout=60)
                times[name].append(time.perf_counter() - begin)
                wait_idle(kernel.client, request)
        row("completion", times[OURS], times[REFERENCE], "1.5")
        growth(kernels[OURS].client, rounds)
    finally:
        for kernel in kernels.values():
            kernel.stop()


def growth(client, rounds):
    """The trivial cell after 20 and after 2 000 cells with 50 live names; a cell of 20 statements."""
    for i in range(50):
        execute(client, f"int live{i} = {i};")
    early = [execute(client, "1 + 1") for _ in range(rounds)]
    for i in range(2000):
        execute(client, f"live{i % 50} = {i};")
    late = [execute(client, "1 + 1") for _ in range(rounds)]
    print(f"| trivial cell after 2 000 cells | {median_ms(late):.0f} ms | {median_ms(early):.0f} ms (early) "
          f"| {median_ms(late) / median_ms(early):.2f} | 1.5 |")
    one = [execute(client, "live1 = live2 + 1;") for _ in range(rounds)]
    twenty = [execute(client, "\n".join(f"live{i} = live{i + 1} + 1;" for i in range(20))) for _ in range(rounds)]
    print(f"| cell of 20 plain statements | {median_ms(twenty):.0f} ms | {median_ms(one):.0f} ms (1 statement) "
          f"| {median_ms(twenty) / median_ms(one):.2f} | 3 |")


def main():
    parser = argparse.ArgumentParser(description=__doc__.split("\n\n")[0])
    parser.add_argument("--jar", type=Path, required=True)
    parser.add_argument("--java", default="java")
    parser.add_argument("--starts", type=int, default=20)
    parser.add_argument("--rounds", type=int, default=200)
    args = parser.parse_args()
    root = Path(tempfile.mkdtemp(prefix="pinchoff-benchmark-"))
    try:
        os.environ.update(JUPYTER_PATH=str(root / "share" / "jupyter"), JUPYTER_RUNTIME_DIR=str(root / "runtime"))
        (root / "runtime").mkdir(mode=0o700)
        subprocess.run([args.java, "-jar", str(args.jar), "register", "--prefix", str(root)], check=True,
                       stdout=subprocess.DEVNULL)
        print("| what | Pinchoff | reference kernel | ratio | at most |\n|---|---|---|---|---|")
        starts(args.starts)
        warm(args.rounds)
    finally:
        shutil.rmtree(root, ignore_errors=True)
    return 0


if __name__ == "__main__":
    sys.exit(main())
