"""Bytes that are no HTTP request, or break off in one."""

import json

from hostile_requests import FILM, PIPE
from wire import post

GOOD = post(FILM, PIPE)
BODY = json.dumps({"geometry": "nonsense"}).encode()
START = f"POST {FILM} HTTP/1.1\r\nhost: service\r\ncontent-type: application/json\r\n".encode()

BROKEN = [
    b"\r\n\r\n",
    b"GET\r\n\r\n",
    b"GET /\r\n\r\n",
    b"GET / HTTP/9.9\r\n\r\n",
    b"GET / HTTP/2.0\r\nhost: service\r\n\r\n",
    b"GET / HTTP/1.1 HTTP/1.1\r\nhost: service\r\n\r\n",
    b"GET /a b HTTP/1.1\r\nhost: service\r\n\r\n",
    b"GET nothing HTTP/1.1\r\nhost: service\r\n\r\n",
    b"CONNECT service:80 HTTP/1.1\r\nhost: service\r\n\r\n",
    b"GET /\x00 HTTP/1.1\r\nhost: service\r\n\r\n",
    b"G\xffT / HTTP/1.1\r\nhost: service\r\n\r\n",
    b"GET / HTTP/1.1\r\nhost service\r\n\r\n",
    b"GET / HTTP/1.1\r\n: service\r\n\r\n",
    b"GET / HTTP/1.1\r\nho st: service\r\n\r\n",
    b"GET / HTTP/1.1\r\nhost: ser\x00vice\r\n\r\n",
    b"GET /nothing HTTP/1.1\r\nhost: service\r\n folded: header\r\n\r\n",
    b"PRI * HTTP/2.0\r\n\r\nSM\r\n\r\n",
    b"\x16\x03\x01\x02\x00\x01\x00\x01\xfc\x03\x03" + bytes(505),  # the start of a TLS handshake
    b"\x00" * 4096,
    START + b"content-length: -1\r\n\r\n" + BODY,
    START + b"content-length: 1e3\r\n\r\n" + BODY,
    START + b"content-length: 99999999999999999999999\r\n\r\n" + BODY,
    START + b"content-length: 1\r\ncontent-length: 2\r\n\r\n" + BODY,
    START + b"content-length: 22\r\ntransfer-encoding: chunked\r\n\r\n0\r\n\r\n",
    START + b"transfer-encoding: nonsense\r\n\r\n" + BODY,
    START + b"transfer-encoding: chunked\r\n\r\nzz\r\n" + BODY,
    START + b"transfer-encoding: chunked\r\n\r\n-1\r\n" + BODY,
    START + b"transfer-encoding: chunked\r\n\r\nffffffffffffffffff\r\n" + BODY,
    START + b"transfer-encoding: chunked\r\n\r\n5\r\n{\r\n",
]


def broken_bytes(random):
    """Garbage, a listed breach of HTTP, or a good request that breaks off."""
    kind = random.randrange(3)
    if kind == 0:
        return random.randbytes(random.randrange(1, 2_000))
    if kind == 1:
        return random.choice(BROKEN)
    return GOOD[: random.randrange(1, len(GOOD))]
