-- One POST /v1/film over and over; the body comes from the environment.
wrk.method = "POST"
wrk.path = "/v1/film"
wrk.headers["content-type"] = "application/json"
wrk.body = os.getenv("BODY")
