#!/usr/bin/python3
"""Drives real notebook clients against the packaged kernel.

    peers.py --jar kernel/target/pinchoff.jar --demo notebooks-demo --shots kernel/target/peers [CHECK ...]

Without names all checks run: conformance, headless, convert, console, frontend. The kernel is registered into a
private folder first; nothing of the user's own notebook set-up is read or changed. A missing program fails the run and
says what to install. Exit: 0 all as it must be, 1 not, 2 usage or something is missing.
"""
import argparse
import contextlib
import importlib
import os
import shutil
import subprocess
import sys
import tempfile
import time
from pathlib import Path

NEEDS = {  # module or program: Debian package
    "jupyter_client": "python3-jupyter-client",
    "jupyter_kernel_test": "python3-jupyter-kernel-test",
    "nbclient": "python3-nbclient",
    "nbformat": "python3-nbformat",
    "nbconvert": "jupyter-nbconvert",
    "jupyter_console": "jupyter-console",
    "notebook": "jupyter-notebook",
    "selenium": "python3-selenium",
    "chromium": "chromium",
    "chromedriver": "chromium-driver",
}
CHECKS = ("conformance", "headless", "convert", "console", "frontend")


class Setup:
    """Where the registered kernel, the demo notebooks and scratch files are."""

    def __init__(self, args, root):
        self.kernel = "pinchoff"
        self.demo = args.demo.resolve()
        self.shots = args.shots.resolve()
        self.scratch = root / "scratch"
        self.spec = root / "prefix" / "share" / "jupyter" / "kernels" / self.kernel
        self.scratch.mkdir()
        self.shots.mkdir(parents=True, exist_ok=True)


def missing():
    for name, package in NEEDS.items():
        if name in ("chromium", "chromedriver"):
            if shutil.which(name) is None:
                yield package
        else:
            try:
                importlib.import_module(name)
            except ImportError:
                yield package


@contextlib.contextmanager
def private_setup(args):
    root = Path(tempfile.mkdtemp(prefix="pinchoff-peers-"))
    try:
        for name in ("data", "config", "runtime"):
            (root / name).mkdir(mode=0o700)
        os.environ.update(
            JUPYTER_DATA_DIR=str(root / "data"), JUPYTER_CONFIG_DIR=str(root / "config"),
            JUPYTER_RUNTIME_DIR=str(root / "runtime"), IPYTHONDIR=str(root / "config"),
            JUPYTER_PATH=str(root / "prefix" / "share" / "jupyter"))
        subprocess.run([args.java, "-jar", str(args.jar.resolve()), "register", "--prefix", str(root / "prefix")],
                       check=True, stdout=subprocess.DEVNULL)
        yield Setup(args, root)
    finally:
        shutil.rmtree(root, ignore_errors=True)


def main():
    parser = argparse.ArgumentParser(description=__doc__.split("\n\n")[0])
    parser.add_argument("--jar", type=Path, required=True)
    parser.add_argument("--demo", type=Path, required=True)
    parser.add_argument("--shots", type=Path, required=True, help="folder for screenshots")
    parser.add_argument("--java", default="java")
    parser.add_argument("checks", nargs="*", help=", ".join(CHECKS))
    args = parser.parse_args()
    unknown = set(args.checks) - set(CHECKS)
    if unknown:
        parser.error(f"no check named {', '.join(sorted(unknown))}; there are {', '.join(CHECKS)}")
    absent = sorted(set(missing()))
    if absent:
        print(f"peers: these are not installed: apt-get install {' '.join(absent)}", file=sys.stderr)
        return 2
    failed = []
    with private_setup(args) as setup:
        for name in args.checks or CHECKS:
            begin = time.monotonic()
            problems = importlib.import_module(f"{name}_check").problems(setup)
            print(f"peers: {name:12s} {'FAILED' if problems else 'passed'} in {time.monotonic() - begin:.1f} s", flush=True)
            for problem in problems:
                print(f"  {problem}", file=sys.stderr)
            failed += [name] * bool(problems)
    print(f"peers: {len(failed)} failed" if failed else "peers: all as it must be")
    return 1 if failed else 0


if __name__ == "__main__":
    sys.exit(main())
