"""The service as a process of its own, started from its binary."""

import signal
import subprocess
import threading


class Service:
    """A running service; its log lines gather in `log`.

    Use it in a `with` statement: what still runs at the end is killed.
    """

    def __init__(self, binary, *flags):
        self.process = subprocess.Popen(
            [binary, "serve", "--listen", "127.0.0.1:0", *flags],
            stdout=subprocess.PIPE,
            stderr=subprocess.PIPE,
            text=True,
        )
        self.log = []
        self._reader = threading.Thread(target=self._read_log, daemon=True)
        self._reader.start()
        first = self.process.stdout.readline().strip()
        self.url = first.removeprefix("listening on ")
        if not self.url.startswith("http://"):
            self.process.kill()
            self._reader.join(5)
            raise RuntimeError(f"{binary} said {first!r} and logged {self.log}")

    def _read_log(self):
        self.log.extend(line.rstrip("\n") for line in self.process.stderr)

    def terminate(self):
        self.process.send_signal(signal.SIGTERM)

    def exit_code(self, timeout):
        """The exit code, or None when it still runs after the time."""
        try:
            code = self.process.wait(timeout)
        except subprocess.TimeoutExpired:
            return None
        self._reader.join(5)
        return code

    def __enter__(self):
        return self

    def __exit__(self, *_):
        self.process.kill()
        self.process.wait()
        self.process.stdout.close()
        self._reader.join(5)
