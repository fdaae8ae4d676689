#!/usr/bin/env bash
# Everything that must hold before a change goes in, on any fresh machine: installs what is missing, starts
# a database that is thrown away afterwards, checks, tests, builds, drives the built program in a browser.
#   test.sh                      all of it
#   test.sh lint unit            only these: format lint types unit database build e2e
# shellcheck disable=SC2154  # variables of the parts that are sourced below
set -euo pipefail
root=$(cd "$(dirname "${BASH_SOURCE[0]}")/.." && pwd)
cd "$root"
for part in messages data-folder prerequisites cluster build; do
  # shellcheck source=/dev/null
  source "$root/scripts/$part.sh"
done
export NEXT_TELEMETRY_DISABLED=1 CI=${CI:-true}

all_steps=(format lint types unit database build e2e)
steps=("$@")
if ((${#steps[@]} == 0)); then steps=("${all_steps[@]}"); fi
failed_steps=()
reports=()
kinds=""

is_wanted() {
  [[ " ${steps[*]} " == *" $1 "* ]]
}

stop_everything() {
  local status=$?
  trap '' INT TERM HUP
  trap - EXIT
  stop_watching_npm
  stop_running_child
  if [[ -n ${data_folder:-} && -f $data_folder/throw-away ]]; then throw_cluster_away; fi
  exit "$status"
}
trap stop_everything EXIT
trap 'exit 130' INT
trap 'exit 143' TERM
trap 'exit 129' HUP
end_with_npm

# step NAME COMMAND...: a failure is remembered and the other steps still run, so that one run tells all.
step() {
  local name=$1 began=$SECONDS
  shift
  is_wanted "$name" || return 0
  say ""
  say "── $name"
  if "$@"; then
    say "$name: in order ($((SECONDS - began)) s)"
  else
    say "$name: FAILED ($((SECONDS - began)) s)"
    failed_steps+=("$name")
  fi
}

# vitest_step NAME KINDS PROJECT...: the report goes to the sum at the end.
vitest_step() {
  local name=$1 report=$data_folder/$1.json project arguments=()
  is_wanted "$name" || return 0
  kinds+=",$2"
  shift 2
  for project in "$@"; do arguments+=(--project "$project"); done
  step "$name" run_stoppable "$root/node_modules/.bin/vitest" run "${arguments[@]}" \
    --reporter=default --reporter=json --outputFile.json="$report"
  if [[ -f $report ]]; then reports+=("$report"); fi
}

use_test_database() {
  if [[ -n ${TEST_DATABASE_URL:-} ]]; then
    [[ $TEST_DATABASE_URL =~ ^[^?]*_test(\?.*)?$ ]] ||
      fail "TEST_DATABASE_URL names a database that does not end in _test." \
        "The tests empty their database; only one with such a name is safe from mistakes."
    ensure_postgres
    return 0
  fi
  # shellcheck disable=SC2034  # read by start_cluster
  database_name=panelwright_test
  start_cluster
  export TEST_DATABASE_URL=$cluster_url
}

for name in "${steps[@]}"; do
  [[ " ${all_steps[*]} " == *" $name "* ]] || fail "there is no step $name." "The steps are: ${all_steps[*]}."
done
require_node
# Not the data of `npm start`: a folder of its own, deleted at the end; DATABASE_URL is never touched.
unset DATABASE_URL
export PANELWRIGHT_DATA_DIR=$root/.data/test
prepare_data_folder
lock_data_folder "the tests already run in this checkout." "Wait for them to end."
touch "$data_folder/throw-away"
ensure_npm_packages
if is_wanted e2e; then ensure_chromium; fi
if is_wanted database || is_wanted e2e; then use_test_database; fi

step format run_stoppable npx prettier --check --log-level=warn .
step lint run_stoppable npx eslint . --max-warnings=0
step types run_stoppable npx tsc --noEmit
vitest_step unit lib,published,properties,architecture,components unit component
vitest_step database db,app,scripts database
step build build_if_changed
if [[ " ${failed_steps[*]-} " != *" build "* ]]; then
  if is_wanted e2e && ! build_is_current; then
    fail "the browser tests drive the built program, and the build is not of these sources." "npm test -- build e2e"
  fi
  vitest_step e2e e2e e2e
fi

say ""
if ((${#reports[@]} > 0)); then
  KINDS=${kinds#,} node --import tsx "$root/scripts/test-totals.ts" "${reports[@]}" 9>&- || failed_steps+=("tests")
fi
if ((${#failed_steps[@]} > 0)); then
  say "Not in order: ${failed_steps[*]}" >&2
  exit 1
fi
