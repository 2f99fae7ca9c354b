# shellcheck shell=bash
# Starts servers that print "listening on http://HOST:PORT" as their first line, and ends them with the script.

servers=()

# start_server LOG COMMAND...: its address goes to server_url, its process to server_pid, what it logs to LOG.
start_server() {
  local log=$1 line output
  shift
  mkdir -p "$(dirname "$log")"
  exec {output}< <(exec "$@" 2>"$log")
  server_pid=$!
  servers+=("$server_pid")
  if ! IFS= read -r -t 60 line <&"$output" || [[ $line != "listening on http://"* ]]; then
    echo "$1 said '${line:-}' instead of where it listens; its log is $log" >&2
    return 1
  fi
  # Where the tests read it, the rest of standard output is of no interest; the pipe stays open for it.
  # shellcheck disable=SC2034
  server_url=${line#listening on }
}

end_servers() {
  local pid
  for pid in "${servers[@]}"; do
    kill "$pid" 2>/dev/null || true
  done
}
trap end_servers EXIT
