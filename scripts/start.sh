#!/usr/bin/env bash
# Brings Panelwright up from whatever is there: installs what is missing, makes or starts the database,
# migrates and fills it, builds if needed, serves. Ctrl-C stops what this run started, and nothing else.
#   start.sh        the production build
#   start.sh --dev  the development server
# shellcheck disable=SC2154  # variables of the parts that are sourced below
set -euo pipefail
root=$(cd "$(dirname "${BASH_SOURCE[0]}")/.." && pwd)
cd "$root"
for part in messages data-folder prerequisites cluster build; do
  # shellcheck source=/dev/null
  source "$root/scripts/$part.sh"
done
export NEXT_TELEMETRY_DISABLED=1

mode=start
is_serving=no
case ${1:-} in
  "") ;;
  --dev) mode=dev ;;
  *) fail "start.sh does not know the word $1." "It knows --dev, and nothing else." ;;
esac

stop_everything() {
  local status=$?
  trap '' INT TERM HUP
  trap - EXIT
  stop_watching_npm
  stop_running_child
  if [[ $is_serving == yes ]]; then rm -f "$data_folder/web-server"; fi
  stop_own_cluster
  if [[ $is_serving == yes && $status -ge 129 ]]; then
    say "Panelwright has stopped. Your data stay where they are."
    status=0
  fi
  exit "$status"
}
trap stop_everything EXIT
trap 'exit 130' INT
trap 'exit 143' TERM
trap 'exit 129' HUP
end_with_npm

require_web_port() {
  web_port=${PORT:-3000}
  if ! [[ $web_port =~ ^[0-9]{1,5}$ ]] || ((web_port < 1 || web_port > 65535)); then
    fail "PORT=$web_port is not a port number." "Give a number from 1024 to 65535, for example PORT=3001 npm start."
  fi
  if port_is_free "$web_port"; then return 0; fi
  if ((web_port < 1024 && EUID != 0)); then
    fail "port $web_port may be used by root only, or it is taken." "Choose another: PORT=3001 npm start"
  fi
  local next=$((web_port + 1))
  while ((next < 65535)) && ! port_is_free "$next"; do next=$((next + 1)); done
  fail "port $web_port is taken by another program (or by a Panelwright that still runs)." \
    "Stop that one, or choose another port: PORT=$next npm start"
}

# A run that was killed outright leaves its web server behind. With the lock in our hands nobody watches
# over it any more, and its mark proves that it is that server and not a later process of the same number.
end_left_over_server() {
  local mark="" pid
  if [[ -f $data_folder/web-server ]]; then mark=$(cat "$data_folder/web-server"); fi
  pid=${mark%% *}
  if [[ -n $pid && $(process_mark "$pid") == "$mark" && $mark == *" "?* ]]; then
    say "Stopping the web server that an interrupted run left behind."
    running_child=$pid
    stop_running_child
  fi
  rm -f "$data_folder/web-server"
}

reach_database() {
  if [[ -n ${DATABASE_URL:-} ]]; then
    say "Using the database that DATABASE_URL names."
    ensure_postgres_client
    return 0
  fi
  start_cluster
  export DATABASE_URL=$cluster_url
}

fill_database() {
  run_stoppable node --import tsx "$root/scripts/db.ts" migrate seed ||
    fail "the database could not be brought up to date (the reason is above)." \
      "Nothing was lost: a dump of the state before is in $data_folder/dumps where there was data."
}

serve() {
  local next=$root/node_modules/next/dist/bin/next
  require_web_port
  set -m
  NODE_ENV=$([[ $mode == dev ]] && echo development || echo production) \
    node "$next" "$mode" --hostname 127.0.0.1 --port "$web_port" </dev/null 9>&- &
  running_child=$!
  set +m
  process_mark "$running_child" >"$data_folder/web-server"
  node "$root/scripts/wait-for-health.mjs" "http://127.0.0.1:$web_port/api/health" "$running_child" 9>&- &
  wait $! || fail "the web server did not come up (its own words are above)."
  is_serving=yes
  say ""
  say "Panelwright is ready at http://127.0.0.1:$web_port   (Ctrl-C stops it)"
  show_demo_people
  wait "$running_child" || fail "the web server has ended by itself (its own words are above)."
}

# The seeder has printed the passwords at the start that made them.
show_demo_people() {
  local people=$data_folder/demo-people.json
  if [[ -f $people ]]; then say "The demo people and their passwords are kept in $people."; fi
}

require_node
read_settings_file
prepare_data_folder
lock_data_folder "Panelwright already runs with the data in $data_folder." \
  "Stop that one first, or start another with PANELWRIGHT_DATA_DIR=/another/folder PORT=3001 npm start."
end_left_over_server
require_web_port
ensure_npm_packages
reach_database
ensure_secret session-secret
export NEXTAUTH_SECRET=${NEXTAUTH_SECRET:-$(read_secret session-secret)}
export NEXTAUTH_URL=${NEXTAUTH_URL:-http://127.0.0.1:$web_port}
if [[ $mode == start ]]; then
  build_if_changed || fail "the program could not be built (the reason is above)."
fi
# After the build: a program that cannot be built migrates nothing, and the passwords stay in sight.
fill_database
serve
