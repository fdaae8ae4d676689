# shellcheck shell=bash disable=SC2154  # $root and the like come from the script that sources this
# What must be on the machine: Node, the npm packages of the lock file, Debian packages.
# Sourced after messages.sh and data-folder.sh.

require_node() {
  local version major minor
  command -v node >/dev/null || fail "Node is not installed." "Panelwright runs on Node 20, from 20.19 on."
  version=$(node --version)
  version=${version#v}
  IFS=. read -r major minor _ <<<"$version"
  if ((major != 20 || minor < 19)); then
    fail "this is Node $version; Panelwright runs on Node 20, from 20.19 on." \
      "Install Node 20 and start again. (\`node --version\` shows which one is found first.)"
  fi
}

# Installs the packages where they are missing or do not match the lock file.
ensure_npm_packages() {
  local reason
  if reason=$(node "$root/scripts/packages-in-step.mjs"); then return 0; fi
  [[ -w $root ]] || fail "you may not write into $root." "Start as the user who owns the folder."
  need_disk "$root" 2000 "for the packages and the build"
  say "Installing the npm packages ($reason). This takes a few minutes."
  run_stoppable npm ci --include=dev --ignore-scripts --no-audit --no-fund ||
    fail "npm could not install the packages (its own words are above)." \
      "Most often the registry cannot be reached: check the network or proxy, then start again."
}

as_root() {
  if ((EUID == 0)); then "$@"; else sudo "$@"; fi
}

# require_root_or_sudo WHAT PACKAGE...: may ask for the password of sudo where the machine wants one.
require_root_or_sudo() {
  local what=$1
  shift
  command -v apt-get >/dev/null ||
    fail "$what is missing, and this system has no apt-get to install it with." "Install it by hand: $*."
  if ((EUID != 0)); then
    command -v sudo >/dev/null ||
      fail "$what is missing, and installing it needs root or sudo." "As root, once: apt-get install $*"
    sudo -v || fail "sudo refused, so $what cannot be installed." "As root, once: apt-get install $*"
  fi
}

# ensure_debian_packages WHAT PACKAGE...: installs them from Debian, asking nothing.
ensure_debian_packages() {
  local what=$1
  shift
  require_root_or_sudo "$what" "$@"
  need_disk / 1000 "to install $what"
  say "Installing $what from Debian's packages."
  run_to_its_end as_root env DEBIAN_FRONTEND=noninteractive apt-get update -q ||
    fail "apt-get update failed (its own words are above)." "Check the network and /etc/apt/sources.list."
  run_to_its_end as_root env DEBIAN_FRONTEND=noninteractive \
    apt-get install -q -y --no-install-recommends -o DPkg::Lock::Timeout=300 "$@" ||
    fail "apt-get could not install $what (its own words are above)." \
      "If it speaks of an interrupted dpkg: run \`dpkg --configure -a\` as root, then start again."
}

postgres_programs=""

# postgres_programs = the folder of initdb and pg_ctl: of one major version where it is given, else of the newest.
find_postgres() {
  local wanted=${1:-}
  postgres_programs=$(find /usr/lib/postgresql -mindepth 3 -maxdepth 3 -path "*/${wanted:-*}/bin/initdb" 2>/dev/null |
    sort -V | tail -n 1)
  postgres_programs=${postgres_programs%/initdb}
  [[ -n $postgres_programs ]]
}

# The Debian package would start a server of its own on port 5432 at once; a setting that is there only
# during the installation keeps it from that.
ensure_postgres() {
  local settings=/etc/postgresql-common/createcluster.d/panelwright.conf wanted=${1:-}
  if find_postgres "$wanted"; then return 0; fi
  require_root_or_sudo "PostgreSQL" "postgresql${wanted:+-$wanted}"
  as_root sh -c "mkdir -p '${settings%/*}' && echo 'create_main_cluster = false' >'$settings'"
  ensure_debian_packages "PostgreSQL" "postgresql${wanted:+-$wanted}"
  as_root rm -f "$settings"
  find_postgres "$wanted" || fail "PostgreSQL was installed, but its programs are not under /usr/lib/postgresql."
}

ensure_postgres_client() {
  if command -v pg_dump >/dev/null && command -v psql >/dev/null; then return 0; fi
  ensure_debian_packages "PostgreSQL's client programs" postgresql-client
}

ensure_chromium() {
  if [[ -x /usr/bin/chromium ]]; then return 0; fi
  ensure_debian_packages "Chromium, which the browser tests drive," chromium
}
