#!/usr/bin/env bash
# The finite-element study behind the through-bar model: installs CalculiX where it is missing, runs the column
# stubs and writes results.json beside this file. About ten minutes; no part of test.sh.
# shellcheck disable=SC2154  # variables of the parts that are sourced below
set -euo pipefail
root=$(cd "$(dirname "${BASH_SOURCE[0]}")/../.." && pwd)
cd "$root"
for part in messages data-folder prerequisites; do
  # shellcheck source=/dev/null
  source "$root/scripts/$part.sh"
done
trap stop_running_child EXIT
trap 'exit 130' INT
trap 'exit 143' TERM

require_node
ensure_npm_packages
command -v ccx >/dev/null || ensure_debian_packages "CalculiX, which solves the finite elements," calculix-ccx
run_stoppable npx tsx scripts/fe/study.ts
