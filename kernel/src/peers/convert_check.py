"""The public converter executes the first demo notebook and makes an HTML page of it."""
import subprocess
import sys


def problems(setup):
    page = setup.scratch / "first-bias.html"
    done = subprocess.run(
        [sys.executable, "-m", "nbconvert", "--to", "html", "--execute", f"--ExecutePreprocessor.kernel_name={setup.kernel}",
         "--output-dir", str(page.parent), "--output", page.name, str(setup.demo / "first-bias.ipynb")],
        stdout=subprocess.PIPE, stderr=subprocess.STDOUT, text=True, timeout=240)
    if done.returncode:
        return [f"the converter failed: {done.stdout[-2000:]}"]
    html = page.read_text("utf-8")
    found = [f"the page has no {what}" for what, mark in (("table", "pinchoff-"), ("picture", "data:image/png;base64,"))
             if mark not in html]
    return found
