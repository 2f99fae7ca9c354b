"""The command under test: one Nusselt number per line of dimensionless groups."""

import json
import math
import subprocess
import sys
from dataclasses import asdict


class NusseltCommand:
    """Runs the command named on the command line, for example

    python3 tests/reference/check_formulas.py cargo run -q --example nusselt --

    With `--list` appended it prints its method ids, one per line; otherwise it answers each
    line `{"method": id, "rayleigh": .., ...}` with a line `{"nusselt": x}`.
    """

    def __init__(self, words):
        self.words = words

    @classmethod
    def from_arguments(cls):
        if len(sys.argv) < 2:
            sys.exit(f"usage: {sys.argv[0]} COMMAND...")
        return cls(sys.argv[1:])

    def _run(self, words, text):
        finished = subprocess.run(words, input=text, capture_output=True, text=True, check=False)
        if finished.returncode != 0:
            sys.exit(f"{' '.join(words)} ended with {finished.returncode}\n{finished.stderr}")
        return finished.stdout.splitlines()

    def method_ids(self):
        return self._run([*self.words, "--list"], "")

    def nusselt(self, method_id, groups):
        """One number per entry of `groups`; not-a-number for an answer without one."""
        lines = [json.dumps({"method": method_id, **asdict(one)}) for one in groups]
        answers = self._run(self.words, "".join(line + "\n" for line in lines))
        if len(answers) != len(lines):
            sys.exit(f"{method_id}: {len(lines)} lines asked, {len(answers)} answered")
        return [_number(answer) for answer in answers]


def _number(line):
    try:
        value = json.loads(line)["nusselt"]
    except (ValueError, KeyError, TypeError):
        return math.nan
    return float(value) if isinstance(value, (int, float)) else math.nan
