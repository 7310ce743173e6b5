"""Writes the tables of reference values as TOML.

What: the one place that turns nested dictionaries into text, so that every file of this folder has
the same layout: plain keys first, then sub-tables, then lists of tables. A number is written with
as many digits as give the same double again (at most 17); whole numbers stay whole.
How to run: not a program; the other files of this folder import it.
"""

import pathlib


def _value(value):
    if isinstance(value, bool):
        return "true" if value else "false"
    if isinstance(value, int):
        return str(value)
    if isinstance(value, str):
        return '"' + value.replace("\\", "\\\\").replace('"', '\\"') + '"'
    if isinstance(value, (list, tuple)):
        return "[" + ", ".join(_value(item) for item in value) + "]"
    number = float(value)
    if number != number or number in (float("inf"), float("-inf")):
        raise ValueError(f"a reference value must be finite, found {number}")
    return repr(number)


def _is_rows(value):
    return isinstance(value, (list, tuple)) and len(value) > 0 and isinstance(value[0], dict)


def _lines(table, path):
    plain = {k: v for k, v in table.items() if not isinstance(v, dict) and not _is_rows(v)}
    lines = [f"{key} = {_value(value)}" for key, value in plain.items() if value is not None]
    for key, value in table.items():
        if isinstance(value, dict):
            lines += ["", f"[{path}{key}]"] + _lines(value, f"{path}{key}.")
        elif _is_rows(value):
            for row in value:
                lines += ["", f"[[{path}{key}]]"] + _lines(row, f"{path}{key}.")
    return lines


def write(program, about, table):
    """Writes `table` beside `program` (its `__file__`), with `about` as comment lines on top."""
    target = pathlib.Path(program).with_suffix(".toml")
    head = [f"# {line}".rstrip() for line in about.strip().splitlines()]
    name = pathlib.Path(program).name
    head.append(f"# Written by tests/outside/{name}; run it again instead of editing this file.")
    target.write_text("\n".join(head + [""] + _lines(table, "")) + "\n", encoding="utf-8")
