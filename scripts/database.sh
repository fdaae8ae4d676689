#!/usr/bin/env bash
# The local database by itself, for work on the program: start | stop | throw-away | remove.
#   start       makes it where there is none, starts it and leaves it running
#   stop        stops it
#   throw-away  the same as start, in a data folder that `remove` may delete
#   remove      stops and deletes a throw-away one; refuses any other
# shellcheck disable=SC2154  # variables of the parts that are sourced below
set -euo pipefail
root=$(cd "$(dirname "${BASH_SOURCE[0]}")/.." && pwd)
for part in messages data-folder prerequisites cluster; do
  # shellcheck source=/dev/null
  source "$root/scripts/$part.sh"
done

require_node
read_settings_file
prepare_data_folder
case ${1:-} in
  start | throw-away)
    if [[ $1 == throw-away ]]; then touch "$data_folder/throw-away"; fi
    start_cluster
    if [[ $started_cluster == yes ]]; then printf 'kept' >"$data_folder/database-owner"; fi
    say "The database runs on port $cluster_port of 127.0.0.1; its address is in $secrets_folder/database-url."
    ;;
  stop | remove)
    choose_cluster_folder
    find_postgres || fail "PostgreSQL is not installed."
    if [[ $1 == remove ]]; then throw_cluster_away; else stop_cluster; fi
    ;;
  *) fail "say what to do: start, stop, throw-away or remove." ;;
esac
