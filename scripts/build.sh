# shellcheck shell=bash
# The production build, made again only when what goes into it has changed. Sourced after messages.sh.

build_stamp=$root/.next/panelwright-build

# One hash over everything that next build reads, and over the tools it is built with.
source_state() {
  (
    cd "$root"
    find app components lib models seeders public proxy.ts next.config.mjs postcss.config.mjs tailwind.config.ts \
      tsconfig.json package.json package-lock.json -type f -print0 2>/dev/null |
      LC_ALL=C sort -z | xargs -0 sha256sum | sha256sum
    node --version
  ) | sha256sum | cut -c 1-64
}

build_is_current() {
  [[ -f $root/.next/BUILD_ID && -f $build_stamp && $(cat "$build_stamp") == "$(source_state)" ]]
}

build_if_changed() {
  local state
  if build_is_current; then return 0; fi
  need_disk "$root" 500 "for the build"
  state=$(source_state)
  rm -f "$build_stamp"
  say "Building the program. This takes a minute or two."
  run_stoppable node "$root/node_modules/next/dist/bin/next" build ||
    fail "the program could not be built (the reason is above)."
  printf '%s\n' "$state" >"$build_stamp"
}
