"""An operator's folder of fluids: a good one is served, a broken one keeps the service from starting.

python3 tests/clients/own_fluids.py BINARY
"""

import json
import subprocess
import sys
import tempfile
import urllib.request
from pathlib import Path

from service import Service

TABLE = Path(__file__).parents[2] / "src" / "fluids" / "tables" / "engine-oil.csv"
QUERY = "geometry=sphere&diameter=0.1&surface_temperature=350&ambient_temperature=320&want=nusselt"


def figure(url, fluid):
    with urllib.request.urlopen(f"{url}/v1/film?{QUERY}&fluid={fluid}", timeout=10) as answer:
        return float(answer.read())


def served(binary, folder):
    """The same table under another name gives the same figure, and stands in the catalogue."""
    text = TABLE.read_text(encoding="utf-8").replace("# id: engine-oil", "# id: gear-oil")
    (folder / "gear-oil.csv").write_text(text, encoding="utf-8")
    with Service(binary, "--fluids", str(folder)) as service:
        if figure(service.url, "gear-oil") != figure(service.url, "engine-oil"):
            yield "the operator's table gives another figure than the built-in one"
        with urllib.request.urlopen(f"{service.url}/v1/fluids", timeout=10) as answer:
            ids = [fluid["id"] for fluid in json.load(answer)["fluids"]]
        if "gear-oil" not in ids:
            yield "the operator's fluid is not in the catalogue"


def refused(binary, folder):
    """Every fault of every file is told by file and line, and nothing is served."""
    lines = TABLE.read_text(encoding="utf-8").replace("# id: engine-oil", "# id: oil-a").splitlines()
    lines[-1] = lines[-1].replace(",", ",x", 1)
    (folder / "a.csv").write_text("\n".join(lines) + "\n", encoding="utf-8")
    (folder / "b.csv").write_text("no table\n", encoding="utf-8")
    command = [binary, "serve", "--listen", "127.0.0.1:0", "--fluids", str(folder)]
    run = subprocess.run(command, capture_output=True, text=True, timeout=20, check=False)
    if run.returncode == 0 or run.stdout:
        yield f"started with a broken folder: exit code {run.returncode}, {run.stdout!r}"
    for place in (f"a.csv:{len(lines)}:", "b.csv:"):
        if place not in run.stderr:
            yield f"{place} is not named in {run.stderr!r}"


def main():
    if len(sys.argv) != 2:
        sys.exit(f"usage: {sys.argv[0]} BINARY")
    faults = []
    for look in (served, refused):
        with tempfile.TemporaryDirectory() as folder:
            faults += [f"{look.__name__}: {fault}" for fault in look(sys.argv[1], Path(folder))]
    for fault in faults:
        print(f"own fluids: {fault}")
    print(f"own fluids: 2 looked at, {len(faults)} faults")
    sys.exit(bool(faults))


if __name__ == "__main__":
    main()
