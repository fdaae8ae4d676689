#!/usr/bin/env bash
# Keeps database, uploaded files and secrets in one archive: backup.sh [FILE]
# May run while Panelwright runs. The archive holds secrets and is readable by this user alone.
# shellcheck disable=SC2154  # variables of the parts that are sourced below
set -euo pipefail
root=$(cd "$(dirname "${BASH_SOURCE[0]}")/.." && pwd)
for part in messages data-folder prerequisites cluster connection; do
  # shellcheck source=/dev/null
  source "$root/scripts/$part.sh"
done
umask 077
staging=""

clean_up() {
  local status=$?
  trap - EXIT
  if [[ -n $staging ]]; then rm -rf "$staging"; fi
  stop_own_cluster
  exit "$status"
}
trap clean_up EXIT
trap 'exit 130' INT TERM HUP

# The migrations that the data have been through, so that a restore can tell a newer program's archive.
list_migrations() {
  if [[ $(query "select to_regclass('schema_migrations') is not null") == t ]]; then
    query "select name from schema_migrations order by name"
  fi
}

require_node
read_settings_file
prepare_data_folder
mkdir -p "$data_folder/backups"
target=$data_folder/backups/panelwright-$(date -u +%Y%m%dT%H%M%SZ).tar
if [[ -n ${1:-} ]]; then target=$(path_as_given "$1"); fi
[[ ! -e $target ]] || fail "$target is already there." "Name another file; a backup is never written over."
[[ -d ${target%/*} && -w ${target%/*} ]] || fail "nothing can be written into ${target%/*}."
need_disk "${target%/*}" 100 "for the backup"
connect

staging=$(mktemp -d -p "$data_folder" backup.XXXXXX)
pg_dump --format=custom --no-owner --no-privileges --file="$staging/database.dump" ||
  fail "the database could not be dumped (the reason is above); no backup was written."
list_migrations >"$staging/migrations"
cp -a "$data_folder/files" "$staging/files"
mkdir "$staging/secrets"
for kept in secrets/session-secret demo-people.json; do
  if [[ -f $data_folder/$kept ]]; then cp -a "$data_folder/$kept" "$staging/secrets/"; fi
done
(cd "$staging" && find database.dump migrations files secrets -type f -print0 | xargs -0 sha256sum) >"$staging.sums"
mv "$staging.sums" "$staging/checksums"
tar --create --file="$target.part" --directory="$staging" checksums database.dump migrations files secrets ||
  { rm -f "$target.part"; fail "the archive could not be written (the reason is above)."; }
chmod 600 "$target.part"
mv "$target.part" "$target"
say "Backup written: $target"
say "It holds the secrets too: keep it where only you can read it."
