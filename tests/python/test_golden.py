"""The golden cases in Python: the same bits as Rust, through job text and through the typed way."""

import subprocess
import sys
from pathlib import Path

import golden

ROOT = Path(__file__).parents[2]
FOLDER = ROOT / "tests" / "golden"


def answers(*command: str) -> list[str]:
    done = subprocess.run(command, cwd=ROOT, capture_output=True, text=True, encoding="utf-8")
    assert done.returncode == 0, done.stderr
    return done.stdout.splitlines()


def rust(*arguments: str) -> list[str]:
    return answers("cargo", "run", "--quiet", "--example", "golden", "--", *arguments)


def python(*arguments: str) -> list[str]:
    return answers(sys.executable, str(Path(golden.__file__)), *arguments)


def test_job_text_gives_the_bits_of_rust() -> None:
    found = python("job", str(FOLDER))
    assert len(found) > 900
    assert found == rust("job", str(FOLDER))


def test_the_typed_way_gives_the_bits_of_rust_and_of_job_text() -> None:
    found = python("typed")
    assert len(found) > 400
    assert found == rust("typed")
    through_text, _ = golden.job(FOLDER)
    assert set(found) <= set(through_text)


def test_the_expected_results_are_what_their_script_works_out() -> None:
    answers(sys.executable, str(FOLDER / "write_expect.py"), "--check")


def test_a_missed_tolerance_fails_the_runner(tmp_path: Path) -> None:
    case = "simple-uniform"
    (tmp_path / "cases.txt").write_text(f"{case}\n")
    (tmp_path / f"{case}.toml").write_text((FOLDER / f"{case}.toml").read_text())
    path = 'combinations["permanent"].initial.deflection.greatest.value_m'
    (tmp_path / f"{case}.expect").write_text(f"0.0126 0.0126 1e-6 {path}\n")
    _, [miss] = golden.job(tmp_path)
    assert miss.startswith(f"{case} {path}: 0.012")
    assert miss.endswith(" is not 0.0126 within 1e-06")
    assert golden.main(["job", str(tmp_path)]) == 1
