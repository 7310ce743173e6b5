"""Every example in a docstring, and in the readme, runs and prints what it says."""

import doctest
import inspect
import re
from pathlib import Path
from types import ModuleType
from typing import Any

import pytest

import beamcore

ROOT = Path(__file__).parents[2]


def documented(owner: Any, prefix: str) -> dict[str, str]:
    """The docstrings of an object and of what it holds, by their names."""
    found = {prefix: inspect.getdoc(owner) or ""}
    if inspect.isclass(owner):
        for name, member in vars(owner).items():
            if not name.startswith("_"):
                # A static method bears the docstring of its class `staticmethod`.
                told = getattr(owner, name) if isinstance(member, staticmethod) else member
                found[f"{prefix}.{name}"] = inspect.getdoc(told) or ""
    return found


DOCS = {"beamcore": beamcore.__doc__ or ""}
for name in beamcore.__all__:
    if not isinstance(getattr(beamcore, name), (str, beamcore.Unit, ModuleType)):
        DOCS |= documented(getattr(beamcore, name), name)
# Documented at the base of all errors.
for name in ("kind", "path", "problems"):
    del DOCS[f"BeamcoreError.{name}"]


@pytest.mark.parametrize("name", DOCS)
def test_everything_is_documented(name: str) -> None:
    assert DOCS[name].strip().endswith((".", ")", "`", "True")) or ">>>" in DOCS[name]


EXAMPLES = [name for name, text in DOCS.items() if ">>>" in text]


def test_there_are_examples() -> None:
    assert len(EXAMPLES) >= 20


@pytest.mark.parametrize("name", EXAMPLES)
def test_examples_print_what_they_say(name: str) -> None:
    globals_ = {exported: getattr(beamcore, exported) for exported in beamcore.__all__}
    test = doctest.DocTestParser().get_doctest(DOCS[name], globals_, name, None, 0)
    report: list[str] = []
    results = doctest.DocTestRunner().run(test, out=report.append)
    assert results.attempted > 0
    assert results.failed == 0, "".join(report)


def test_the_readme_prints_what_it_says(capsys: pytest.CaptureFixture[str]) -> None:
    text = (ROOT / "beamcore-py" / "README.md").read_text(encoding="utf-8")
    codes = re.findall(r"```python\n(.*?)```", text, re.DOTALL)
    said = []
    names: dict[str, Any] = {}
    for code in codes:
        exec(code, names)
        said += re.findall(r"^print\(.*\) +# (.*)$", code, re.MULTILINE)
    assert len(codes) == 4 and len(said) == 7
    assert capsys.readouterr().out.splitlines() == said
