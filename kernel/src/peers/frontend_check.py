"""The classic notebook in headless Chromium: run all, restart, completion, help, progress, an error, interrupt.

Screenshots are written for a person to look at: this check cannot judge how a page looks.
"""
import contextlib
import json
import secrets
import shutil
import socket
import subprocess
import sys
import time
import urllib.request

from selenium import webdriver
from selenium.webdriver.chrome.service import Service
from selenium.webdriver.common.keys import Keys
from selenium.webdriver.support.ui import WebDriverWait

IDLE = """
return window.Jupyter && Jupyter.notebook && Jupyter.notebook.kernel && Jupyter.notebook.kernel.is_connected()
  && document.querySelectorAll('.code_cell.running').length === 0
  && ![...document.querySelectorAll('.code_cell .input_prompt')].some(p => p.textContent.includes('*'))
  && document.querySelector('#kernel_indicator_icon.kernel_idle_icon') !== null;
"""


def free_port():
    with socket.socket() as s:
        s.bind(("127.0.0.1", 0))
        return s.getsockname()[1]


@contextlib.contextmanager
def server(folder, log):
    port, token = free_port(), secrets.token_hex(16)
    process = subprocess.Popen(
        [sys.executable, "-m", "notebook", "--no-browser", "--allow-root", "--ip=127.0.0.1", f"--port={port}",
         "--NotebookApp.port_retries=0", f"--NotebookApp.token={token}", f"--notebook-dir={folder}"],
        stdout=log, stderr=subprocess.STDOUT)
    try:
        deadline = time.monotonic() + 60
        while True:
            try:
                with urllib.request.urlopen(f"http://127.0.0.1:{port}/api?token={token}", timeout=5):
                    break
            except OSError:
                if process.poll() is not None or time.monotonic() > deadline:
                    raise
                time.sleep(0.2)
        yield f"http://127.0.0.1:{port}", token
    finally:
        process.terminate()
        try:
            process.wait(timeout=15)
        except subprocess.TimeoutExpired:
            process.kill()


@contextlib.contextmanager
def browser(scratch):
    options = webdriver.ChromeOptions()
    options.binary_location = shutil.which("chromium")
    for flag in ("--headless", "--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run",
                 "--disable-background-networking", "--disable-component-update", "--disable-sync",
                 f"--user-data-dir={scratch / 'profile'}", "--window-size=1200,1000"):
        options.add_argument(flag)
    driver = webdriver.Chrome(service=Service(shutil.which("chromedriver")), options=options)
    try:
        yield driver
    finally:
        driver.quit()


class Page:
    """One open notebook."""

    def __init__(self, driver, shots):
        self.driver, self.shots, self.found = driver, shots, []

    def do(self, script, *args):
        return self.driver.execute_script(script, *args)

    def wait(self, script, what, seconds=90, *args):
        try:
            WebDriverWait(self.driver, seconds, poll_frequency=0.1).until(lambda _: self.do(script, *args))
            return True
        except Exception as e:  # a time-out or a page that went away: the finding names what was waited for
            self.found.append(f"{what}: not within {seconds} s ({type(e).__name__})")
            return False

    def shot(self, name, whole=False):
        if whole:
            height = self.do("return document.querySelector('#notebook-container').scrollHeight + 220;")
            self.driver.set_window_size(1200, min(max(height, 700), 12000))
            time.sleep(0.7)  # the page lays itself out again
        self.driver.save_screenshot(str(self.shots / f"{name}.png"))
        if whole:
            self.driver.set_window_size(1200, 1000)

    def new_cell(self, code, run=True):
        self.do("""
            const cell = Jupyter.notebook.insert_cell_at_bottom('code');
            cell.set_text(arguments[0]);
            Jupyter.notebook.select(Jupyter.notebook.ncells() - 1);
            cell.focus_cell();
            window.lastCell = cell;
            Jupyter.notebook.scroll_to_bottom();
            if (arguments[1]) cell.execute();
            """, code, run)

    def outputs(self):
        return json.loads(self.do("""
            return JSON.stringify(Jupyter.notebook.get_cells().filter(c => c.cell_type === 'code' && c.get_text().trim())
              .map(c => ({prompt: c.input_prompt_number, outputs: c.output_area.outputs.map(o => ({
                 kind: o.output_type, types: o.data ? Object.keys(o.data) : [], text: o.evalue || o.text || ''}))})));
            """))


def run_all(page):
    page.do("Jupyter.notebook.execute_all_cells();")
    page.wait(IDLE, "run all")
    cells = page.outputs()
    for number, cell in enumerate(cells, start=1):
        if cell["prompt"] != number:
            page.found.append(f"cell {number} has the prompt {cell['prompt']!r}")
        page.found += [f"cell {number} failed: {o['text']}" for o in cell["outputs"] if o["kind"] == "error"]
    pictures = page.do("return [...document.querySelectorAll('.output img')].filter(i => i.naturalWidth > 100 && i.offsetWidth > 100).length;")
    if pictures < 2:
        page.found.append(f"{pictures} pictures are visible, at least 2 expected")
    if page.do("return document.querySelectorAll('.output table').length;") < 2:
        page.found.append("fewer than 2 tables are visible")


def restart(page):
    page.do("Jupyter.notebook.clear_all_output(); Jupyter.notebook.restart_run_all({confirm: false});")
    page.wait("const c = Jupyter.notebook.get_cells().find(x => x.cell_type === 'code'); return c.input_prompt_number === 1;",
              "restart")
    page.wait(IDLE, "run all after restart")


def completion(page):
    page.new_cell("mV(650).pl", run=False)
    page.do("lastCell.focus_editor(); lastCell.code_mirror.setCursor(0, 10);")
    webdriver.ActionChains(page.driver).send_keys(Keys.TAB).perform()
    page.wait("return document.querySelector('#complete') !== null || lastCell.get_text() !== 'mV(650).pl';", "completion", 15)
    page.shot("completion")
    if "plus" not in page.do("return lastCell.get_text() + [...document.querySelectorAll('#complete option')].map(o => o.textContent);"):
        page.found.append("completion of mV(650).pl does not offer plus")
    webdriver.ActionChains(page.driver).send_keys(Keys.ESCAPE).perform()
    page.do("lastCell.set_text('');")


def help_on_a_name(page):
    page.new_cell("mV(650)", run=False)
    page.do("lastCell.focus_editor(); lastCell.code_mirror.setCursor(0, 2);")
    webdriver.ActionChains(page.driver).key_down(Keys.SHIFT).send_keys(Keys.TAB).key_up(Keys.SHIFT).perform()
    page.wait("const t = document.querySelector('#tooltip'); return t && t.offsetHeight > 0 && t.textContent.includes('mV');", "help", 15)
    page.shot("help")
    webdriver.ActionChains(page.driver).send_keys(Keys.ESCAPE).perform()
    page.do("lastCell.set_text('');")


def mistake(page):
    page.new_cell('var reference = uA(20);\nreference.plus(V(1))')
    page.wait(IDLE, "a cell with a mistake")
    page.wait("return lastCell.output_area.outputs.some(o => o.output_type === 'error');", "error output", 10)
    page.shot("error")


def interrupt(page):
    page.new_cell("while (true) { }")
    page.wait("return document.querySelector('#kernel_indicator_icon.kernel_busy_icon') !== null;", "a busy kernel", 15)
    page.do("Jupyter.notebook.kernel.interrupt();")
    page.wait("return lastCell.output_area.outputs.some(o => o.output_type === 'error');", "interrupt", 10)
    page.wait(IDLE, "idle after the interrupt", 10)
    page.new_cell("reference")
    page.wait("return lastCell.output_area.outputs.some(o => o.data && o.data['text/plain'].includes('20'));",
              "a variable after the interrupt", 15)


def progress(page):
    page.new_cell("try (var p = progress(\"corners\", 40)) { for (int i = 0; i < 40; i++) { Thread.sleep(60); p.step(); } }")
    page.wait("return lastCell.output_area.outputs.length > 0;", "progress", 15)
    time.sleep(1)
    page.shot("progress")
    page.wait(IDLE, "the end of the progress cell", 30)


def problems(setup):
    folder = setup.scratch / "frontend"
    shutil.copytree(setup.demo, folder)
    with open(setup.scratch / "server.log", "wb") as log, server(folder, log) as (address, token), browser(setup.scratch) as driver:
        page = Page(driver, setup.shots)
        driver.get(f"{address}/notebooks/first-bias.ipynb?token={token}")
        if page.wait("return window.Jupyter && Jupyter.notebook && Jupyter.notebook._fully_loaded && Jupyter.notebook.kernel"
                     " && Jupyter.notebook.kernel.info_reply.status === 'ok';", "a ready kernel"):
            run_all(page)
            page.shot("first-bias", whole=True)
            restart(page)
            for step in (completion, help_on_a_name, mistake, progress, interrupt):
                step(page)
        page.do("window.onbeforeunload = null; if (window.Jupyter) Jupyter.notebook.kernel.kill && Jupyter.notebook.session.delete();")
    return page.found
