"""What makes an answer a well-formed refusal (RFC 9457)."""

MEDIA_TYPE = "application/problem+json"


def problem_faults(answer, has_body=True):
    """Everything in which an answer is not a well-formed problem."""
    media = answer.headers.get("content-type", "")
    if media.split(";")[0].strip() != MEDIA_TYPE:
        return [f"content type {media!r}"]
    if answer.status == 405 and "allow" not in answer.headers:
        return ["405 without Allow"]
    if not has_body:
        return ["a body in answer to HEAD"] if answer.body else []
    try:
        problem = answer.json()
    except ValueError as error:
        return [f"body is not JSON: {error}"]
    if not isinstance(problem, dict):
        return ["body is not an object"]
    return [*_member_faults(problem, answer.status), *_entry_faults(problem, answer.status)]


def _member_faults(problem, status):
    for name in ("type", "title", "detail"):
        if not isinstance(problem.get(name), str) or not problem[name]:
            yield f"{name} is {problem.get(name)!r}"
    if problem.get("status") != status:
        yield f"status is {problem.get('status')!r} in an answer with {status}"


def _entry_faults(problem, status):
    entries = problem.get("errors")
    if not isinstance(entries, list):
        yield "errors is not a list"
        return
    if status == 422 and not entries:
        yield "errors is empty"
    for entry in entries:
        if not isinstance(entry, dict):
            yield f"an error is {entry!r}"
            continue
        for name in ("code", "detail"):
            if not isinstance(entry.get(name), str) or not entry[name]:
                yield f"an error's {name} is {entry.get(name)!r}"
        pointer = entry.get("pointer")
        if not isinstance(pointer, str) or not (pointer == "#" or pointer.startswith("#/")):
            yield f"an error's pointer is {pointer!r}"
