#!/usr/bin/env python3
"""How the service treats connections, deadlines, signals and its log, with processes of its own.

    python3 tests/clients/manners.py BINARY
"""

import json
import socket
import sys
import time
from urllib.parse import urlencode

from hostile_requests import PIPE
from problem import problem_faults
from service import Service
from wire import Answer, Connection, address, exchange, post, request

HEADER_SECONDS = 1.0
BODY_SECONDS = 1.5
DRAIN_SECONDS = 2.0
BODY_BYTES = 1000
SLACK = 1.5  # seconds that a busy machine may add to any deadline

QUERY = f"/v1/film?{urlencode(PIPE)}"
GOOD = post("/v1/film", PIPE)
HALF = len(GOOD) - 20  # the headers and the body but for its last bytes


def timed(action):
    """What an action returns, or the TimeoutError it raises, and the seconds it took."""
    began = time.monotonic()
    try:
        result = action()
    except TimeoutError as error:
        result = error
    return result, time.monotonic() - began


def status_fault(name, answer, status):
    if not isinstance(answer, Answer) or answer.status != status:
        yield f"{name}: {answer!r} instead of {status}"


def refusal_faults(name, answer, status):
    yield from status_fault(name, answer, status)
    if isinstance(answer, Answer) and answer.status == status:
        yield from (f"{name}: {fault}" for fault in problem_faults(answer))


def close_fault(name, answer):
    """A caller must be told that a connection with an unread body is closed (RFC 9112, 9.6)."""
    if isinstance(answer, Answer) and answer.headers.get("connection") != "close":
        yield f"{name}: without connection: close"


def deadline_fault(name, seconds, deadline):
    if not deadline * 0.9 <= seconds <= deadline + SLACK:
        yield f"{name}: after {seconds:.2f} s instead of {deadline} s"


def health(service):
    for path in ("/health/live", "/health/ready", "/v1/version", "/", "/docs", "/openapi.json", "/favicon.ico"):
        yield from status_fault(path, exchange(service.url, request("GET", path)), 200)


def head_and_options(service):
    whole = exchange(service.url, request("GET", QUERY))
    head = exchange(service.url, request("HEAD", QUERY))
    yield from status_fault("HEAD", head, 200)
    if head and (head.body or head.headers["content-length"] != str(len(whole.body))):
        yield f"HEAD: {len(head.body)} bytes, content-length {head.headers['content-length']} for {len(whole.body)}"
    options = exchange(service.url, request("OPTIONS", "/v1/film"))
    allowed = {word.strip() for word in (options.headers.get("allow") or "").split(",")} if options else set()
    if not options or not 200 <= options.status < 300 or not {"GET", "HEAD", "POST"} <= allowed:
        yield f"OPTIONS: {options}"


def entity_tag(service):
    first = exchange(service.url, request("GET", QUERY))
    tag = first.headers.get("etag")
    again = exchange(service.url, request("GET", QUERY, None, [f"if-none-match: {tag}"]))
    yield from status_fault(f"If-None-Match: {tag}", again, 304)


def request_ids_and_log(service):
    connection = Connection(service.url)
    given = connection.exchange(request("GET", "/v1/version", None, ["x-request-id: call-17"]))
    made = [connection.exchange(request("GET", "/nothing")).headers.get("x-request-id") for _ in range(2)]
    ugly = connection.exchange(request("GET", "/nothing", None, ["x-request-id: a b\t{}"]))
    connection.close()
    if given.headers.get("x-request-id") != "call-17":
        yield f"x-request-id call-17 came back as {given.headers.get('x-request-id')}"
    if not all(made) or made[0] == made[1]:
        yield f"ids made for two requests: {made}"
    if "{" in (ugly.headers.get("x-request-id") or "{"):
        yield f"an ugly id came back: {ugly.headers.get('x-request-id')}"
    yield from log_faults(service, {"call-17": 200, made[0]: 404, made[1]: 404})


def log_faults(service, statuses):
    """Whether the log is JSON throughout, with one line for each request id and its status."""
    deadline = time.monotonic() + SLACK
    while time.monotonic() < deadline and not all(any(str(id) in line for line in service.log) for id in statuses):
        time.sleep(0.02)
    entries = []
    for line in list(service.log):
        try:
            entries.append(json.loads(line))
        except ValueError:
            yield f"a log line is not JSON: {line!r}"
    for id, status in statuses.items():
        found = [entry for entry in entries if _member(entry, "request_id") == id]
        if len(found) != 1 or _member(found[0], "status") != status:
            yield f"log of request {id}: {found}"


def _member(entry, name):
    return entry.get(name, entry.get("fields", {}).get(name))


def stalled_headers(service):
    connection = Connection(service.url)
    connection.send(GOOD[:40])
    answer, seconds = timed(connection.answer)
    yield from deadline_fault("stalled headers", seconds, HEADER_SECONDS)
    if isinstance(answer, TimeoutError) or answer and answer.status != 408:
        yield f"stalled headers: {answer!r}"


def dripping_headers(service):
    dripping = socket.create_connection(address(service.url), timeout=0.1)
    began = time.monotonic()
    for byte in GOOD[:100]:
        try:
            dripping.sendall(bytes([byte]))
            dripping.recv(1)
            break
        except TimeoutError:
            continue
        except ConnectionError:
            break
    yield from deadline_fault("dripping headers", time.monotonic() - began, HEADER_SECONDS)
    dripping.close()


def body_sizes(service):
    body = json.dumps(PIPE).encode()
    full = body.ljust(BODY_BYTES)
    yield from status_fault("a body as large as allowed", exchange(service.url, post("/v1/film", full)), 200)
    answer = exchange(service.url, post("/v1/film", full + b" "))
    yield from refusal_faults("a body one byte too large", answer, 413)
    yield from close_fault("a body one byte too large", answer)
    announced = ["content-type: application/json", "content-length: 1000000000000", "expect: 100-continue"]
    answer, seconds = timed(lambda: exchange(service.url, request("POST", "/v1/film", None, announced)))
    yield from refusal_faults("a too large body announced", answer, 413)
    if seconds > 0.5:
        yield f"a too large body announced: answered after {seconds:.2f} s"


def slow_body(service):
    connection = Connection(service.url)
    connection.send(GOOD[:HALF])
    answer, seconds = timed(lambda: connection.answer("POST"))
    yield from deadline_fault("slow body", seconds, BODY_SECONDS)
    yield from refusal_faults("slow body", answer, 408)
    yield from close_fault("slow body", answer)


def drained_end(service):
    running, idle = Connection(service.url), Connection(service.url)
    yield from status_fault("before the end", idle.exchange(GOOD), 200)
    running.send(GOOD[:HALF])
    time.sleep(0.2)
    service.terminate()
    time.sleep(0.3)
    try:
        exchange(service.url, GOOD, timeout=1.0)
        yield "a connection was taken after SIGTERM"
    except ConnectionRefusedError:
        pass
    running.send(GOOD[HALF:])
    yield from status_fault("the running request", running.answer("POST"), 200)
    code, seconds = timed(lambda: service.exit_code(DRAIN_SECONDS + SLACK))
    if code != 0 or seconds > 1.0:
        yield f"exit code {code} after {seconds:.2f} s with nothing left to do"


def bounded_end(service):
    stuck = Connection(service.url)
    stuck.send(GOOD[:HALF])
    time.sleep(0.2)
    service.terminate()
    code, seconds = timed(lambda: service.exit_code(DRAIN_SECONDS + SLACK))
    yield from deadline_fault("the end with a stuck request", seconds, DRAIN_SECONDS)
    if code != 0:
        yield f"exit code {code} with a stuck request"
    stuck.close()


HURRIED = [
    "--header-timeout", str(HEADER_SECONDS), "--body-timeout", str(BODY_SECONDS), "--body-bytes", str(BODY_BYTES),
]  # fmt: skip
PATIENT = ["--drain-timeout", str(DRAIN_SECONDS)]

# Each service with its flags, and what is looked at one after the other; only the last may end it.
PLAN = [
    (HURRIED, [health, head_and_options, entity_tag, request_ids_and_log, stalled_headers, dripping_headers,
               body_sizes, slow_body]),
    (PATIENT, [drained_end]),
    (PATIENT, [bounded_end]),
]  # fmt: skip


def main():
    if len(sys.argv) != 2:
        sys.exit(f"usage: {sys.argv[0]} BINARY")
    faults, looked_at = [], 0
    for flags, manners in PLAN:
        with Service(sys.argv[1], *flags) as service:
            for manner in manners:
                looked_at += 1
                faults += [f"{manner.__name__}: {fault}" for fault in manner(service)]
    for fault in faults:
        print(f"manners: {fault}")
    print(f"manners: {looked_at} looked at, {len(faults)} faults")
    sys.exit(bool(faults))


if __name__ == "__main__":
    main()
