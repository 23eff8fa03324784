"""The reference headless client runs each demo notebook; what it writes is valid and has no error."""
import warnings

import nbclient
import nbformat


def run(setup, path, out):
    notebook = nbformat.read(path, as_version=4)
    nbclient.NotebookClient(notebook, kernel_name=setup.kernel, timeout=120,
                            resources={"metadata": {"path": str(path.parent)}}).execute()
    nbformat.write(notebook, out)
    with warnings.catch_warnings():
        warnings.simplefilter("error")
        nbformat.validate(nbformat.read(out, as_version=4))
    return notebook


def problems(setup):
    found = []
    notebooks = sorted(p for p in setup.demo.glob("*.ipynb") if not p.name.endswith(".out.ipynb"))
    if not notebooks:
        return [f"no notebook in {setup.demo}"]
    for path in notebooks:
        try:
            done = run(setup, path, setup.scratch / path.name)
        except Exception as e:  # a failed cell, a dead kernel, an invalid file: each is a finding
            found.append(f"{path.name}: {type(e).__name__}: {e}")
            continue
        code = [c for c in done.cells if c.cell_type == "code" and c.source.strip()]
        print(f"  {path.name}: {len(code)} cells, {sum(len(c.outputs) for c in code)} outputs")
        if [c.execution_count for c in code] != list(range(1, len(code) + 1)):
            found.append(f"{path.name}: the cells are not numbered 1 to {len(code)}")
        if not any(c.outputs for c in code):
            found.append(f"{path.name}: no cell has an output")
    return found
