#!/usr/bin/env python3
"""Generates a client from the service's OpenAPI document, and uses it as a caller would.

    python3 tests/clients/generated_client.py URL
"""

import importlib
import os
import shutil
import subprocess
import sys
from pathlib import Path

PACKAGE = "plumeline_client"
FOLDER = Path(__file__).resolve().parents[2] / "target" / "generated-client"

# A bare 88.9 mm pipe at 160 degC in still air of 20 degC: convection by Churchill & Chu 1975 with the
# air of CoolProp at 90 degC, where sources of air's properties differ by some tenths of a per cent;
# radiation by Stefan and Boltzmann.
PIPE = {
    "geometry": "horizontal-cylinder",
    "diameter": "88.9 mm",
    "surface_temperature": "160 degC",
    "ambient_temperature": "20 degC",
    "emissivity": 0.9,
}
EXPECTED = {
    "heat_transfer_coefficient": (7.41, 0.05),  # W/(m2 K)
    "convective_heat_flow_per_length": (289.6, 1.5),  # W/m
    "radiative_heat_flow_per_length": (396.46, 0.01),  # W/m
}


def generate(url):
    shutil.rmtree(FOLDER, ignore_errors=True)
    FOLDER.mkdir(parents=True)
    tools = Path(sys.executable).parent  # the generator formats with ruff, which it looks for on PATH
    command = [tools / "openapi-python-client", "generate", "--url", f"{url}/openapi.json", "--meta", "none"]
    subprocess.run(
        [*command, "--output-path", FOLDER / PACKAGE, "--fail-on-warning"],
        env={**os.environ, "PATH": f"{tools}:{os.environ['PATH']}"},
        check=True,
    )
    sys.path.insert(0, str(FOLDER))


def module(name):
    return importlib.import_module(f"{PACKAGE}.{name}")


def figure_faults(name, value):
    expected, tolerance = EXPECTED[name]
    if not isinstance(value, float) or abs(value - expected) > tolerance:
        yield f"{name} is {value!r} instead of {expected}"


def good_post(client):
    request = module("models").FilmRequest.from_dict(PIPE)
    response = module("api.film.create_film").sync_detailed(client=client, body=request)
    if response.status_code != 200:
        yield f"{response.status_code}: {response.content[:300]}"
        return
    for name in EXPECTED:
        yield from figure_faults(name, getattr(response.parsed, name))


def refused_post(client):
    request = module("models").FilmRequest.from_dict({**PIPE, "diameter": "88.9 degC"})
    response = module("api.film.create_film").sync_detailed(client=client, body=request)
    problem = response.parsed
    if response.status_code != 422 or problem.status != 422:
        yield f"{response.status_code}: {response.content[:300]}"
    elif [fault.pointer for fault in problem.errors] != ["#/diameter"]:
        yield f"errors are {problem.errors}"


def whole_get(client):
    geometry = module("models").ReadFilmGeometry(PIPE["geometry"])
    response = module("api.film.read_film").sync_detailed(client=client, **{**PIPE, "geometry": geometry})
    if response.status_code != 200:
        yield f"{response.status_code}: {response.content[:300]}"
        return
    for name in EXPECTED:
        yield from figure_faults(name, getattr(response.parsed, name))


def one_figure(client):
    # The generator reads the first media type of an answer only, so the bare figure is taken from
    # the client's own connection.
    name = "heat_transfer_coefficient"
    response = client.get_httpx_client().get("/v1/film", params={**PIPE, "want": name})
    if response.status_code != 200 or not response.headers["content-type"].startswith("text/plain"):
        yield f"{response.status_code}: {response.content[:300]}"
        return
    yield from figure_faults(name, float(response.text))


def catalogues(client):
    fluids = module("api.catalogue.list_fluids").sync(client=client)
    if "air" not in [fluid.id for fluid in fluids.fluids]:
        yield f"no air among {fluids}"


def main():
    if len(sys.argv) != 2:
        sys.exit(f"usage: {sys.argv[0]} URL")
    generate(sys.argv[1])
    client = module("client").Client(base_url=sys.argv[1])
    calls = [good_post, refused_post, whole_get, one_figure, catalogues]
    faults = [f"{call.__name__}: {fault}" for call in calls for fault in call(client)]
    for fault in faults:
        print(f"generated client: {fault}")
    print(f"generated client: {len(calls)} calls, {len(faults)} faults")
    sys.exit(bool(faults))


if __name__ == "__main__":
    main()
