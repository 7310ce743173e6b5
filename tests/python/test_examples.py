"""The example programs run and print what is expected."""

import re
import subprocess
import sys
from pathlib import Path

EXAMPLES = Path(__file__).parents[2] / "examples" / "python"


def test_small_member() -> None:
    done = subprocess.run(
        [sys.executable, str(EXAMPLES / "small_member.py")], capture_output=True, text=True
    )
    assert done.returncode == 0, done.stderr
    found = re.fullmatch(r"deflection (\d\.\d\d) mm at (\d\.\d\d) m\n", done.stdout)
    assert found, done.stdout
    # 5 q L^4/(384 EI) with E = 11000/1.6 MPa for C24 (k_def = 0.6) and 210000 MPa for the plate;
    # units N and mm.
    timber, plate = 2 * 47 * 195, 8 * 180
    stiffness = 11000 / 1.6 * timber * 195**2 / 12 + 210000 * plate * 180**2 / 12
    load = 4.5 + 9.80665 * (420 * timber + 7850 * plate) * 1e-9
    assert found[1] == f"{5 * load * 3600**4 / (384 * stiffness):.2f}"
    assert found[2] == "1.80"


def test_every_example_is_run() -> None:
    assert [file.name for file in EXAMPLES.iterdir() if file.suffix == ".py"] == [
        "small_member.py"
    ]
