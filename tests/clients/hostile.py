#!/usr/bin/env python3
"""Sends hostile requests, always the same ones, and accepts nothing but well-formed refusals.

    python3 tests/clients/hostile.py URL COUNT [--pid PID]

Nine in ten are HTTP and wrong within; the tenth is broken as HTTP, where a plain 4xx or a closed
connection will do. Meanwhile some connections stall in their headers. Afterwards the service
must be alive, the same process, and right.
"""

import argparse
import os
import random
import socket
import sys
from collections import defaultdict
from concurrent.futures import ThreadPoolExecutor

from hostile_bytes import broken_bytes
from hostile_requests import FAMILIES, FILM, PIPE
from problem import MEDIA_TYPE, problem_faults
from wire import Connection, address, exchange, post, request

SEED = 20261201
WORKERS = 4
STALLED = 16
SHOWN = 3  # faults of each family; the rest are counted


def answer_faults(answer, method, statuses, parser_answers):
    """Everything that is wrong with an answer to a hostile request."""
    if answer is None:
        return [] if parser_answers else ["closed without an answer"]
    if answer.status not in statuses:
        return [f"{answer.status} instead of {sorted(statuses)}: {answer.body[:120]!r}"]
    if parser_answers and answer.headers.get("content-type", "").split(";")[0] != MEDIA_TYPE:
        return []
    return problem_faults(answer, has_body=method != "HEAD")


def broken_bytes_faults(url, generator):
    connection = Connection(url)
    try:
        connection.send(broken_bytes(generator))
        connection.finish()
        return answer_faults(connection.answer(), "GET", range(400, 500), parser_answers=True)
    finally:
        connection.close()


def family_faults(connection, family, generator):
    data = family.make(generator)
    method = data.partition(b" ")[0].decode()
    return answer_faults(connection.exchange(data), method, family.statuses, family.parser_answers)


def place_faults(url, connection, place):
    """Sends the request of one place; its name and its faults."""
    generator = random.Random(f"{SEED} {place}")
    family = None if place % 10 == 0 else FAMILIES[(place - place // 10) % len(FAMILIES)]
    name = family.name if family else "broken_bytes"
    try:
        if family:
            return name, family_faults(connection, family, generator)
        return name, broken_bytes_faults(url, generator)
    except OSError as error:
        return name, [f"{type(error).__name__}: {error}"]


def worker(url, places):
    """Sends the requests of these places over one connection; names and faults."""
    connection = Connection(url)
    results = []
    for place in places:
        name, faults = place_faults(url, connection, place)
        results.extend((name, f"{name} #{place}: {fault}") for fault in faults)
    connection.close()
    return results


def stalled_connections(url):
    sockets = [socket.create_connection(address(url)) for _ in range(STALLED)]
    for place, stalled in enumerate(sockets):
        stalled.sendall(post(FILM, PIPE)[: 1 + place * 4])
    return sockets


def aftermath(url, pid):
    """What no longer works."""
    if pid is not None:
        try:
            os.kill(pid, 0)
        except ProcessLookupError:
            yield f"process {pid} has ended"
    for name, data in [("/health/live", request("GET", "/health/live")), ("a good request", post(FILM, PIPE))]:
        try:
            answer = exchange(url, data)
        except OSError as error:
            yield f"{name}: {error}"
            continue
        if answer is None or answer.status != 200:
            yield f"{name}: {answer}"


def main():
    parser = argparse.ArgumentParser(description=__doc__.partition("\n")[0])
    parser.add_argument("url")
    parser.add_argument("count", type=int)
    parser.add_argument("--pid", type=int, help="the service's process, which must survive")
    arguments = parser.parse_args()

    stalled = stalled_connections(arguments.url)
    with ThreadPoolExecutor(WORKERS) as pool:
        shares = [range(first, arguments.count, WORKERS) for first in range(WORKERS)]
        faults = [found for share in pool.map(lambda places: worker(arguments.url, places), shares) for found in share]
    for connection in stalled:
        connection.close()
    after = list(aftermath(arguments.url, arguments.pid))

    texts = defaultdict(list)
    for name, text in faults:
        texts[name].append(text)
    for name, found in texts.items():
        print(*(f"hostile: {text}" for text in found[:SHOWN]), sep="\n")
        print(f"hostile: {name} failed {len(found)} times")
    for text in after:
        print(f"hostile: afterwards: {text}")
    print(f"hostile: {arguments.count} requests of {len(FAMILIES)} families and broken bytes, {len(faults)} faults")
    sys.exit(bool(faults or after))


if __name__ == "__main__":
    main()
