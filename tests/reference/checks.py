"""Counts findings and prints each beside its bound."""

import math


class Checks:
    """Prints every finding and keeps those beyond their bound."""

    def __init__(self):
        self.count, self.failures = 0, 0

    def within(self, what, found, bound):
        """`found` is a deviation; nothing else than a number up to `bound` passes."""
        self.count += 1
        passed = abs(found) <= bound
        self.failures += not passed
        print(f"{'ok  ' if passed else 'FAIL'} {what}: {found:+.2e} (bound {bound:.2e})")

    def largest(self, what, deviations, bound, name="Pr"):
        """The largest by size of (value of the group called `name`, deviation)."""
        where, worst = max(deviations, key=lambda pair: _size(pair[1]))
        self.within(f"{what}, worst at {name} {where:.3g}", worst, bound)

    def finish(self):
        """Prints the tally; the status to exit with."""
        print(f"{self.count} checks, {self.failures} failures")
        return 1 if self.failures else 0


def _size(deviation):
    return math.inf if math.isnan(deviation) else abs(deviation)
