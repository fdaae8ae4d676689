# shellcheck shell=bash disable=SC2154  # $root and the like come from the script that sources this
# Talking to the person at the terminal, and running long commands so that Ctrl-C works during them.
# Sourced by the other scripts.

say() {
  printf '%s\n' "$*"
}

# fail HEADLINE [LINE...]: says what went wrong and what to do about it, and ends the script.
fail() {
  printf '\nPanelwright cannot go on: %s\n' "$1" >&2
  shift
  local line
  for line in "$@"; do
    printf '  %s\n' "$line" >&2
  done
  exit 1
}

running_child=""
running_child_may_be_killed=yes

# Runs a command in a process group of its own and waits for it. Bash runs traps during `wait` but not
# during a foreground command, so this is what lets a signal stop an installation or a build at once.
# Descriptor 9 is the lock of this run; no child may keep it.
run_stoppable() {
  local status=0
  set -m
  "$@" </dev/null 9>&- &
  running_child=$!
  set +m
  wait "$running_child" || status=$?
  running_child=""
  return "$status"
}

# The same for a package manager: a signal lets it finish, because half an installation breaks the next one.
run_to_its_end() {
  local status=0
  running_child_may_be_killed=no
  run_stoppable "$@" || status=$?
  running_child_may_be_killed=yes
  return "$status"
}

is_alive() {
  kill -0 -- "$1" 2>/dev/null
}

# Ends what run_stoppable started, its own children included: politely first, then for good.
stop_running_child() {
  local child=$running_child waited=0
  [[ -n $child ]] || return 0
  if [[ $running_child_may_be_killed == no ]]; then
    say "Waiting for the package installation to finish, so that it is not left half done."
    wait "$child" 2>/dev/null || true
    running_child=""
    return 0
  fi
  kill -TERM -- "-$child" 2>/dev/null || true
  while is_alive "-$child" && ((waited < 100)); do
    sleep 0.1
    waited=$((waited + 1))
  done
  kill -KILL -- "-$child" 2>/dev/null || true
  wait "$child" 2>/dev/null || true
  running_child=""
}

# npm hands a SIGTERM to the shell between it and this script, which dies without a word. So a script that
# npm started watches that shell, and ends itself in good order when it is gone.
parent_watch=""
end_with_npm() {
  [[ -n ${npm_lifecycle_event:-} ]] || return 0
  local script=$$ parent=$PPID
  (
    trap - EXIT INT TERM HUP
    exec 9>&-
    while is_alive "$parent"; do sleep 1; done
    kill -TERM "$script" 2>/dev/null
  ) </dev/null >/dev/null 2>&1 &
  parent_watch=$!
}

stop_watching_npm() {
  if [[ -n $parent_watch ]]; then kill "$parent_watch" 2>/dev/null || true; fi
  parent_watch=""
}
