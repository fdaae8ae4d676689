# shellcheck shell=bash disable=SC2154  # $root and the like come from the script that sources this
# The production build, made again only when what goes into it has changed. Sourced after messages.sh.

build_stamp=$root/.next/panelwright-build

# One hash over everything that next build reads, and over the tools it is built with.
source_state() {
  (
    cd "$root" || exit 1
    find app components lib models seeders public proxy.ts next.config.mjs postcss.config.mjs tailwind.config.ts \
      tsconfig.json package.json package-lock.json -type f -print0 2>/dev/null |
      LC_ALL=C sort -z | xargs -0 sha256sum | sha256sum
    node --version
  ) | sha256sum | cut -c 1-64
}

build_is_current() {
  [[ -f $root/.next/BUILD_ID && -f $build_stamp && $(cat "$build_stamp") == "$(source_state)" ]]
}

# A built program that somebody is being served from must not change under them.
build_is_being_served() {
  local lock=$root/.data/lock
  [[ $data_folder != "$root/.data" && -e $lock ]] && ! flock -n "$lock" true
}

# Answers 1 where the build fails.
build_if_changed() {
  local state
  if build_is_current; then
    say "The build is of these sources."
    return 0
  fi
  if build_is_being_served; then
    fail "Panelwright runs from the build in this checkout, and the sources have changed since." \
      "Stop it first (Ctrl-C where it runs)."
  fi
  need_disk "$root" 500 "for the build"
  state=$(source_state)
  rm -f "$build_stamp"
  say "Building the program. This takes a minute or two."
  run_stoppable node "$root/node_modules/next/dist/bin/next" build || return 1
  printf '%s\n' "$state" >"$build_stamp"
}
