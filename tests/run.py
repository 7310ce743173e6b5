"""Runs all tests of the project: `python3 tests/run.py [--only rust|python]`.

Stops at the first step that fails, with a non-zero exit code. Needs cargo and Python 3.10 or later;
the Python packages of the tests go into a virtual environment under the target folder.
"""

import argparse
import os
import shlex
import shutil
import subprocess
import sys
import time
from importlib.util import find_spec
from pathlib import Path

ROOT = Path(__file__).resolve().parents[1]
TARGET = Path(os.environ.get("CARGO_TARGET_DIR", ROOT / "target"))
TARGET = TARGET if TARGET.is_absolute() else ROOT / TARGET
VENV = TARGET / "venv"
PYTHON = VENV / ("Scripts/python.exe" if os.name == "nt" else "bin/python")
# Python files whose annotations are checked.
TYPED = ["tests/python", "examples/python", "tests/run.py"]


def step(*command: str | Path, env: dict[str, str] | None = None) -> None:
    """Runs one command in the root folder; ends the program if it fails."""
    text = shlex.join(map(str, command))
    print(f"== {text}", flush=True)
    start = time.monotonic()
    try:
        code = subprocess.run(command, cwd=ROOT, env={**os.environ, **(env or {})}).returncode
    except FileNotFoundError:
        sys.exit(f"== {command[0]} was not found: is it installed and on the path?")
    took = time.monotonic() - start
    if code != 0:
        print(f"== failed after {took:.1f} s with code {code}: {text}", flush=True)
        sys.exit(code if code > 0 else 1)
    print(f"== passed in {took:.1f} s: {text}", flush=True)


def rust() -> None:
    step("cargo", "test", "--workspace")


def python() -> None:
    environment()
    step(PYTHON, "-m", "pip", "install", "--quiet", "./beamcore-py[test]")
    step(PYTHON, "-m", "pytest", "--quiet", "tests/python")
    step(PYTHON, "-m", "mypy.stubtest", "beamcore")
    step(PYTHON, "-m", "mypy", "--strict", *TYPED, env={"MYPYPATH": "tests/python"})


def environment() -> None:
    """Makes the virtual environment, unless there is one that works."""
    works = [str(PYTHON), "-c", "import pip"]
    if PYTHON.exists() and subprocess.run(works, stderr=subprocess.DEVNULL).returncode == 0:
        return
    shutil.rmtree(VENV, ignore_errors=True)
    TARGET.mkdir(parents=True, exist_ok=True)
    if find_spec("venv") and find_spec("ensurepip"):
        step(sys.executable, "-m", "venv", VENV)
        return
    print(
        "== this Python lacks `venv` or `ensurepip` (some systems have them in a package of "
        "their own, such as python3-venv); trying virtualenv instead",
        flush=True,
    )
    tool = TARGET / "virtualenv"
    step(sys.executable, "-m", "pip", "install", "--quiet", "--target", tool, "virtualenv")
    step(sys.executable, "-m", "virtualenv", "--quiet", VENV, env={"PYTHONPATH": str(tool)})


def main() -> None:
    if sys.version_info < (3, 10):
        sys.exit("the tests need Python 3.10 or later, this is " + sys.version.split()[0])
    parser = argparse.ArgumentParser(description=__doc__)
    parser.add_argument("--only", choices=["rust", "python"], help="run this language alone")
    only = parser.parse_args().only
    if only != "python":
        rust()
    if only != "rust":
        python()
    print("all steps passed")


if __name__ == "__main__":
    main()
