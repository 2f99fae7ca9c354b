"""Families of requests that a service must refuse, each with the statuses that would do.

A family makes one request from a random number generator. None is right by accident: every one
is wrong whatever the generator gives.
"""

import json
from collections.abc import Callable
from dataclasses import dataclass
from random import Random
from urllib.parse import quote

from wire import post, request

FILM = "/v1/film"
BODY_LIMIT = 1 << 20  # bytes, the service's default
PIPE = {
    "geometry": "horizontal-cylinder",
    "diameter": "88.9 mm",
    "surface_temperature": "160 degC",
    "ambient_temperature": "20 degC",
    "emissivity": 0.9,
}
NUMBERS = ["diameter", "surface_temperature", "ambient_temperature", "emissivity", "length", "pressure"]
TEXTS = ["geometry", "fluid", "method", "extrapolate", "id"]


@dataclass(frozen=True)
class Family:
    """A way of being wrong.

    `parser_answers`: the HTTP parser may refuse by itself, in plain text.
    """

    name: str
    make: Callable[[Random], bytes]
    statuses: frozenset[int]
    parser_answers: bool


FAMILIES: list[Family] = []


def refused(*statuses, parser_answers=False):
    """Enters a function in FAMILIES, with the statuses with which its requests are refused."""

    def enter(make):
        FAMILIES.append(Family(make.__name__, make, frozenset(statuses), parser_answers))
        return make

    return enter


def film(**changes):
    return post(FILM, {**PIPE, **changes})


@refused(422)
def broken_fluid_table(random):
    """A fluid of the caller's own that is wrong in one place or another."""
    rows = random.choice([0, 1, 2, 3, 2000])
    table = {
        "temperature": [300 + row for row in range(rows)],
        "density": [900 - row for row in range(rows)],
        "specific_heat": [2000] * rows,
        "viscosity": [0.01] * rows,
        "conductivity": [0.13] * rows,
    }
    name = random.choice(list(table))
    table[name] = random.choice([None, "x", {}, [[]], [None], [-1, 0, 1e308], ["1 kg"] * 3, [5e-324] * 3])
    return film(fluid=table, emissivity=None)


def film_with(name, token):
    """The pipe with one member's value as raw bytes."""
    rest = {key: value for key, value in PIPE.items() if key != name}
    return post(FILM, json.dumps(rest).encode()[:-1] + b', "' + name.encode() + b'": ' + token + b"}")


def film_query(pairs):
    query = "&".join(f"{quote(name)}={quote(str(value))}" for name, value in pairs)
    return request("GET", f"{FILM}?{query}")


# Values


@refused(422)
def wrong_type(random):
    name = random.choice(NUMBERS + TEXTS)
    values = [[], {}, True, False, [1], [[]], {"value": 1}, [None]]
    if name in TEXTS:
        values += [0, -1.5, 1e300]
    return film(**{name: random.choice(values)})


@refused(422)
def number_outside_limits(random):
    name = random.choice(NUMBERS)
    return film(**{name: random.choice([-1, -5e-324, -1e308, 1e12, 1e200, 1.7976931348623157e308])})


@refused(422)
def vanishing_number(random):
    name = random.choice(["diameter", "surface_temperature", "pressure"])
    return film(**{name: random.choice([0, -0.0, 5e-324, 2.2e-308, 1e-200])})


@refused(422)
def number_beyond_double(random):
    return film_with(random.choice(NUMBERS), random.choice([b"1e400", b"-1e400", b"1" * 20_000, b"1e99999999999"]))


@refused(422)
def number_below_double(random):
    return film_with("diameter", random.choice([b"1e-400", b"-1e-400", b"0." + b"0" * 20_000 + b"1"]))


@refused(422)
def bad_quantity(random):
    texts = [
        "", " ", "mm", "200 parsecs", "8 in in", "0,2", "1/0 in", "1//2 in", "--5 mm", "5 mm 5", "1e999 mm",
        "nan", "NaN mm", "inf m", "-infinity m", "5 kg", "5 degC", "DN", "DN -1", "NPS 99999", "0x10 mm",
        "\uff11\uff12 mm", "\u202e5 mm", "\U0001f525", "\u0000", "5\u0000mm", "5 mm\n\n; rm", "'; --",
        "9" * 400 + " m", "(" * 2000 + "5" + ")" * 2000, "5 " + "m" * 3000, "%d", "../../etc/passwd",
    ]  # fmt: skip
    return film(diameter=random.choice(texts))


@refused(422)
def unknown_word(random):
    name = random.choice(["geometry", "fluid", "method", "extrapolate"])
    return film(**{name: random.choice(["", "Air", "auto ", "nonsense", "\u0000", "a" * 100_000, "\ud83d\ude00" * 9])})


@refused(422)
def unknown_field(random):
    name = random.choice(["diametr", "", "\u0000", "Diameter", "__proto__", "x" * 100_000, "a/b~c", "\u202e"])
    return film(**{name: random.choice([1, "1 m", None, [], {}])})


@refused(422)
def hundreds_of_unknown_fields(random):
    return film(**{f"field_{random.randrange(10**9)}_{place}": place for place in range(500)})


@refused(422)
def duplicate_field(random):
    name = random.choice(list(PIPE))
    return film_with("id", b'"a", "%b": 1, "%b": 1' % (name.encode(), name.encode()))


@refused(422)
def missing_field(random):
    name = random.choice(["geometry", "diameter", "surface_temperature", "ambient_temperature"])
    return film(**{name: None})


@refused(422)
def contradiction(random):
    return film(**random.choice([
        {"heat_flux": "500 W/m2"}, {"heat_flow": "500 W"}, {"pressure": "1 bar", "altitude": "10 m"},
        {"height": "1 m"}, {"facing": "up"}, {"method": "vertical-plate-churchill-chu"},
        {"tilt_from_vertical": 20}, {"area": 1}, {"perimeter": 1}, {"width": 1},
    ]))  # fmt: skip


@refused(422)
def bad_units(random):
    name = random.choice(["units", "answer_units"])
    return film(**{name: random.choice([
        5, "K", [], True, {"temperature": "mm"}, {"nonsense": "K"}, {"temperature": 5}, {"temperature": None},
        {"length": ""}, {"length": "parsecs"}, {"": ""}, {"length": {"length": "m"}}, {"length": "m" * 50_000},
    ])})  # fmt: skip


# JSON


@refused(400)
def no_json_number(random):
    tokens = [b"NaN", b"Infinity", b"-Infinity", b"nan", b"0x10", b"01", b".5", b"5.", b"+5", b"1_000", b"1e", b"--1"]
    return film_with(random.choice(NUMBERS), random.choice(tokens))


@refused(400)
def no_json(random):
    good = json.dumps(PIPE)
    return post(FILM, random.choice([
        good.replace('"', "'").encode(), good[:-1].encode() + b",}", good.encode() + b"x", good.encode() * 2,
        b"/* */" + good.encode(), b"\xef\xbb\xbf" + good.encode(), good.encode("utf-16"), good.encode("utf-32"),
        b"geometry=sphere", b"<case/>", b"", b" ", b"\x00", b"{]", b'{"a" 1}', b"{1: 2}", bytes(1000),
        b"{" + random.randbytes(300) + b"\xff",
    ]))  # fmt: skip


@refused(400)
def truncated_json(random):
    good = json.dumps(PIPE).encode()
    return post(FILM, good[: random.randrange(len(good))])


@refused(422)
def no_object(random):
    tokens = [b"5", b'"x"', b"[]", b"null", b"true", b"[{}]", json.dumps([PIPE]).encode(), b"-0.0"]
    return post(FILM, random.choice(tokens))


@refused(400, 422)
def deep_nesting(random):
    depth = random.choice([129, 1_000, 100_000])
    opening, closing = random.choice([(b"[", b"]"), (b'{"a":', b"}")])
    nested = opening * depth + b"1" + closing * random.choice([0, depth])
    return random.choice([post(FILM, nested), film_with("fluid", nested), film_with("units", nested)])


@refused(400)
def broken_utf8(random):
    broken = random.choice([b"\xff", b"\xc0\xaf", b"\xed\xa0\x80", b"\xf5\x80\x80\x80", b"\xe2\x82", b"\x80"])
    return random.choice([film_with("id", b'"' + broken + b'"'), film_with("fluid", b'"air' + broken + b'"')])


@refused(400)
def broken_utf8_in_a_name(random):
    broken = random.choice([b"\xff", b"\xc3", b"\xed\xbf\xbf"])
    return post(FILM, json.dumps(PIPE).encode()[:-1] + b', "' + broken + b'": 1}')


@refused(400, 422)
def lone_surrogate(random):
    token = random.choice([b'"\\ud800"', b'"\\udc00x"', b'"\\ud800\\ud800"', b'"\\u12"', b'"\\x41"'])
    return film_with(random.choice(NUMBERS + TEXTS), token)


@refused(400)
def control_character(random):
    character = bytes([random.choice([0, 1, 8, 9, 10, 13, 31])])
    return film_with(random.choice(["id", "fluid", "diameter"]), b'"a' + character + b'b"')


# Media types, methods and paths


@refused(415)
def wrong_content_type(random):
    types = [
        "text/plain", "text/html", "application/xml", "application/jsonp", "application/x-www-form-urlencoded",
        "multipart/form-data; boundary=x", "json", "/", "", ";", "application/json5", "image/png", "a" * 5_000,
        "application/json/x", "application /json",
    ]  # fmt: skip
    body = json.dumps(PIPE).encode()
    return request("POST", FILM, body, [f"content-type: {random.choice(types)}"])


@refused(415)
def no_content_type(random):
    return request("POST", FILM, random.choice([json.dumps(PIPE).encode(), b"", b"x"]))


@refused(406)
def wrong_accept(random):
    accept = random.choice(["image/png", "application/pdf", "application/json;q=0", "a", "/", "video/*, audio/*"])
    return post(FILM, PIPE, [f"accept: {accept}"])


@refused(405)
def wrong_method(random):
    method = random.choice(["PUT", "DELETE", "PATCH", "TRACE", "BREW", "PROPFIND", "get", "X" * 300])
    path = random.choice([FILM, "/v1/geometries", "/v1/methods", "/v1/fluids", "/v1/version", "/health/live", "/"])
    return request(method, path, random.choice([None, b"", b"{}"]))


@refused(405)
def post_to_a_catalogue(random):
    return post(random.choice(["/v1/geometries", "/v1/methods", "/v1/fluids", "/openapi.json", "/docs"]), PIPE)


@refused(404)
def unknown_path(random):
    path = random.choice([
        "/v2/film", "/v1", "/v1/", "/v1/film/", "/V1/FILM", "//v1/film", "/v1/film/%00", "/v1/../v1/film", "/.git",
        "/v1/fluids/air", "/etc/passwd", "/%2e%2e/%2e%2e/etc/passwd", "/" + "a" * 5_000, "/" + "a/" * 3_000, "/%",
    ])  # fmt: skip
    return random.choice([request("GET", path), post(path, PIPE)])


@refused(404)
def unknown_fluid(random):
    fluid = random.choice(["nonsense", "AIR", "%2e%2e", "air%00", "a" * 3_000, "%F0%9F%94%A5", "air%2Fstate"])
    return request("GET", f"/v1/fluids/{fluid}/state?temperature=300&pressure=101325")


@refused(400, 404)
def broken_utf8_in_the_path(random):
    return request("GET", f"/v1/fluids/{random.choice(['%FF', '%C0%AF', '%ED%A0%80'])}/state?temperature=300")


@refused(422)
def bad_fluid_state(random):
    query = random.choice([
        "", "temperature=", "temperature=NaN", "temperature=inf", "temperature=0", "temperature=-1",
        "temperature=1e400", "temperature=300&temperature=300", "temperature=300&presure=1", "temperature=5 m",
        "temperature=300&pressure=-1", "temperature=300&pressure=0", "temperature=300&pressure=NaN",
        "temperature=1e5", "temperature=5e-324", "temperature=300&pressure=1e300", "temperature=%FF",
    ])  # fmt: skip
    return request("GET", f"/v1/fluids/air/state?{query.replace(' ', '%20')}")


# Queries


@refused(422)
def bad_query_value(random):
    name, value = random.choice([
        ("diameter", "NaN"), ("diameter", "inf"), ("diameter", "-1"), ("diameter", "1e400"), ("diameter", "[]"),
        ("diameter", "5 degC"), ("diameter", ""), ("diametr", "1"), ("want", "nonsense"), ("want", ","),
        ("as", "parsecs"), ("errors", "nonsense"), ("units", "temperature"), ("units", "temperature:mm"),
        ("units", ":::"), ("answer_units", "length:K"), ("fluid", "x" * 10_000), ("", ""), ("a" * 10_000, "1"),
    ])  # fmt: skip
    return film_query([*((key, kept) for key, kept in PIPE.items() if key != name), (name, value)])


@refused(422)
def repeated_parameter(random):
    pair = random.choice(list(PIPE.items()))
    return film_query([*PIPE.items(), *[pair] * random.choice([1, 2, 500])])


@refused(422)
def broken_percent_escape(random):
    broken = random.choice(["%", "%z", "%zz", "%4", "%%", "%u1234", "%FF", "%C0%AF", "%ED%A0%80", "%00", "+%"])
    name, value = random.choice([("fluid", f"air{broken}"), (f"a{broken}", "1"), ("diameter", broken)])
    pairs = [*((key, quote(str(kept))) for key, kept in PIPE.items() if key != name), (name, value)]
    return request("GET", f"{FILM}?" + "&".join(f"{key}={kept}" for key, kept in pairs))


@refused(400, 422, parser_answers=True)
def raw_bytes_in_the_query(random):
    return request("GET", f"{FILM}?fluid=" + random.choice([b"\xff", b"\xc3\xa9", b"\x80"]).decode("utf-8", "surrogateescape"))


@refused(400, 414, 422, 431, parser_answers=True)
def long_query(random):
    return request("GET", f"{FILM}?geometry=" + "a" * random.choice([30_000, 65_000, 70_000, 300_000]))


@refused(404, 405, 422)
def refused_head(random):
    return request("HEAD", random.choice(["/v1/nothing", f"{FILM}?diameter=x", f"{FILM}", "/v1/fluids/x/state"]))


# Sizes and framing


@refused(413)
def large_body(random):
    return film(id="a" * (BODY_LIMIT + random.randrange(4_096)))


@refused(413)
def large_chunked_body(random):
    chunk = b"%x\r\n" % 65_536 + b" " * 65_536 + b"\r\n"
    head = request("POST", FILM, None, ["content-type: application/json", "transfer-encoding: chunked"])
    return head + chunk * (BODY_LIMIT // 65_536 + 1) + b"0\r\n\r\n"


@refused(400, 422)
def bad_chunked_body(random):
    body = random.choice([b"{", b'{"a": 1}', b'{"a":\x00}'])
    chunks = b"".join(b"%x\r\n%b\r\n" % (1, body[place : place + 1]) for place in range(len(body)))
    head = request("POST", FILM, None, ["content-type: application/json", "transfer-encoding: chunked"])
    return head + chunks + b"0\r\n\r\n"


@refused(404, 431, parser_answers=True)
def many_headers(random):
    return request("GET", "/nothing", None, [f"x-{place}: {place}" for place in range(random.choice([90, 110, 2_000]))])


@refused(404, 431, parser_answers=True)
def long_header(random):
    return request("GET", "/nothing", None, ["x-long: " + "a" * random.choice([1_000, 30_000, 500_000])])
