"""Job and outcome documents."""

import json
from pathlib import Path
from typing import Any

import golden
import jsonschema
import pytest

import beamcore
from beamcore import Job

FOLDER = Path(__file__).parents[1] / "golden"
CASES = golden.lines(FOLDER / "cases.txt")
PATH = 'combinations["quasi-permanent"].final.deflection.greatest.value_m'


@pytest.mark.parametrize("case", CASES)
def test_a_job_is_one_however_it_is_read(case: str) -> None:
    file = FOLDER / f"{case}.toml"
    job = Job.open(file)
    outcome = job.solve()
    assert Job.open(str(file)).solve().json == outcome.json
    assert beamcore.run(file.read_text(encoding="utf-8")).json == outcome.json
    assert beamcore.run(job.to_text("json"), format="json").json == outcome.json
    assert Job.read(job.to_text()).solve().json == outcome.json


def test_an_outcome_is_read_by_path_as_data_and_as_text() -> None:
    outcome = Job.open(FOLDER / "flitch.toml").solve()
    data = outcome.as_dict()
    assert data == json.loads(outcome.json)
    # 5 q L^4/(384 EI) with E/1.6 for the timber only, by an independent script: 8.445 mm.
    assert abs(outcome.number(PATH) * 1000 - 8.445) <= 0.0006
    found: Any = [c for c in data["combinations"] if c["name"] == "quasi-permanent"]
    assert found[0]["final"]["deflection"]["greatest"]["value_m"] == outcome.number(PATH)
    assert outcome.text("section.parts[0].name") == data["section"]["parts"][0]["name"]
    summary = outcome.summary()
    assert max(map(len, summary.splitlines())) <= 80
    assert "8.4" in summary


@pytest.mark.parametrize("case", CASES)
def test_documents_fit_their_schemas(case: str) -> None:
    job = Job.open(FOLDER / f"{case}.toml")
    jsonschema.validate(json.loads(job.to_text("json")), json.loads(beamcore.job_schema()))
    jsonschema.validate(job.solve().as_dict(), json.loads(beamcore.outcome_schema()))


def test_formats_and_files() -> None:
    text: Any = "yaml"
    with pytest.raises(beamcore.NameProblem, match='format: found "yaml"'):
        Job.read("version = 1", format=text)
    with pytest.raises(OSError) as caught:
        Job.open(FOLDER / "missing.toml")
    assert isinstance(caught.value, beamcore.FileProblem)
    with pytest.raises(beamcore.FileProblem):
        Job.open(FOLDER / "cases.txt")
    with pytest.raises(beamcore.SyntaxProblem):
        beamcore.run("{", format="json")


def test_version() -> None:
    assert beamcore.__version__ == "0.1.0"
