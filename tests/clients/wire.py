"""Bytes out, one HTTP answer back: a client that sends what no library would."""

import http.client
import json
import socket
from dataclasses import dataclass
from urllib.parse import urlsplit


def address(url):
    """Host and port of a service's address."""
    parts = urlsplit(url)
    return parts.hostname, parts.port


def request(method, target, body=None, headers=()):
    """A request's bytes; a content length goes with a body."""
    lines = [f"{method} {target} HTTP/1.1", "host: service", *headers]
    if body is not None:
        lines.append(f"content-length: {len(body)}")
    # Python's own reading of raw bytes in text: `surrogateescape` lets targets hold any byte.
    head = "\r\n".join([*lines, "", ""]).encode("utf-8", "surrogateescape")
    return head + (body or b"")


def post(target, case, headers=()):
    """A well-formed POST of a JSON body."""
    body = case if isinstance(case, bytes) else json.dumps(case).encode()
    return request("POST", target, body, ["content-type: application/json", *headers])


@dataclass(frozen=True)
class Answer:
    """An HTTP answer as it came."""

    status: int
    headers: http.client.HTTPMessage
    body: bytes

    def json(self):
        """The body, as strict JSON: NaN and infinities are no numbers there."""
        return json.loads(self.body, parse_constant=_refuse_constant)


def _refuse_constant(text):
    raise ValueError(f"{text} in JSON")


class Connection:
    """A connection that is kept open from answer to answer and opened again when it was closed."""

    def __init__(self, url, timeout=20.0):
        self._address = address(url)
        self._timeout = timeout
        self._socket = None

    def send(self, data):
        """Sends bytes and awaits nothing; what the other side no longer reads is its answer to give."""
        if self._socket is None:
            self._socket = socket.create_connection(self._address, self._timeout)
        try:
            self._socket.sendall(data)
        except (BrokenPipeError, ConnectionResetError):
            pass

    def finish(self):
        """Says that nothing more will be sent."""
        try:
            self._socket.shutdown(socket.SHUT_WR)
        except OSError:
            pass

    def answer(self, method="GET"):
        """The next answer, or None when the connection ends without one.

        Raises TimeoutError when neither happens in time.
        """
        response = http.client.HTTPResponse(self._socket, method=method)
        try:
            response.begin()
            answer = Answer(response.status, response.headers, response.read())
        except TimeoutError:
            self.close()
            raise
        except (http.client.HTTPException, ConnectionError):
            self.close()
            return None
        if response.will_close:
            self.close()
        return answer

    def exchange(self, data):
        """Sends a request and returns its answer, or None."""
        self.send(data)
        return self.answer(data.partition(b" ")[0].decode("latin-1"))

    def close(self):
        if self._socket is not None:
            self._socket.close()
            self._socket = None


def exchange(url, data, timeout=20.0):
    """One request on a connection of its own."""
    connection = Connection(url, timeout)
    try:
        return connection.exchange(data)
    finally:
        connection.close()
