#!/usr/bin/python3
"""Checks an executed notebook: valid by the format's schema, no error, tables, pictures, canonical values.

    check_output.py EXECUTED.ipynb [--same-values-as OTHER.ipynb]

Debian package: python3-nbformat. Exit: 0 as it must be, 1 not.
"""
import argparse
import json
import sys
import warnings

import nbformat

VALUES = "application/vnd.pinchoff.values+json"


def outputs(notebook):
    return [o for c in notebook["cells"] if c["cell_type"] == "code" for o in c["outputs"]]


def values(notebook):
    return [o["data"][VALUES] for o in outputs(notebook) if VALUES in o.get("data", {})]


def text(data, mime):
    value = data.get(mime, "")
    return "".join(value) if isinstance(value, list) else value


def main():
    parser = argparse.ArgumentParser()
    parser.add_argument("notebook")
    parser.add_argument("--same-values-as", dest="other")
    args = parser.parse_args()
    with open(args.notebook, encoding="utf-8") as f:
        notebook = json.load(f)
    problems = []
    with warnings.catch_warnings():
        warnings.simplefilter("error")
        try:
            nbformat.validate(notebook, version=4, version_minor=notebook["nbformat_minor"])
        except Exception as e:  # the validator's own kinds of failure and its warnings alike
            problems.append(f"not valid: {e}")
    shown = outputs(notebook)
    problems += [f"error output: {o['ename']}: {o['evalue']}" for o in shown if o["output_type"] == "error"]
    html = "\n".join(text(o.get("data", {}), "text/html") for o in shown)
    tables = html.count("<table")
    pictures = sum("image/png" in o.get("data", {}) for o in shown) or html.count("data:image/png;base64,")
    if tables < 2:
        problems.append(f"{tables} HTML tables, at least 2 expected")
    if pictures < 2:
        problems.append(f"{pictures} pictures, at least 2 expected")
    if not values(notebook):
        problems.append(f"no {VALUES} entry")
    if args.other:
        with open(args.other, encoding="utf-8") as f:
            if json.dumps(values(json.load(f))) != json.dumps(values(notebook)):
                problems.append(f"the canonical values differ from those of {args.other}")
    print(f"{args.notebook}: {len(shown)} outputs, {tables} tables, {pictures} pictures, {len(values(notebook))} values entries")
    for problem in problems:
        print(f"PROBLEM: {problem}", file=sys.stderr)
    return 1 if problems else 0


if __name__ == "__main__":
    sys.exit(main())
