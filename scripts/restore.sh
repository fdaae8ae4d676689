#!/usr/bin/env bash
# Puts a backup back: restore.sh FILE [--replace]
# A database that already has tables is left alone unless --replace is given, and then it is backed up first.
# Everything in the archive is checked before anything here is touched.
# shellcheck disable=SC2154  # variables of the parts that are sourced below
set -euo pipefail
root=$(cd "$(dirname "${BASH_SOURCE[0]}")/.." && pwd)
for part in messages data-folder prerequisites cluster connection; do
  # shellcheck source=/dev/null
  source "$root/scripts/$part.sh"
done
umask 077
staging=""
archive=""
replace=no

clean_up() {
  local status=$?
  trap - EXIT
  if [[ -n $staging ]]; then rm -rf "$staging"; fi
  stop_own_cluster
  exit "$status"
}
trap clean_up EXIT
trap 'exit 130' INT TERM HUP

read_arguments() {
  local word
  for word in "$@"; do
    case $word in
      --replace) replace=yes ;;
      -*) fail "restore does not know $word." "npm run restore -- FILE [--replace]" ;;
      *) archive=$(path_as_given "$word") ;;
    esac
  done
  [[ -n $archive ]] || fail "say which backup to restore." "npm run restore -- FILE [--replace]"
  [[ -f $archive ]] || fail "there is no file $archive."
}

# Names that leave the folder, and anything that is not a plain file or folder, are refused before unpacking.
unpack() {
  local listing
  listing=$(tar --list --verbose --file="$archive" 2>/dev/null) || fail "$archive is not a backup, or it is cut short."
  if grep -qv '^[-d]' <<<"$listing" ||
    tar --list --file="$archive" | grep -qvE '^(checksums|database\.dump|migrations|(files|secrets)/.*)$' ||
    tar --list --file="$archive" | grep -qE '(^|/)\.\.(/|$)'; then
    fail "$archive holds things that no backup of Panelwright holds; nothing was unpacked."
  fi
  staging=$(mktemp -d -p "$data_folder" restore.XXXXXX)
  tar --extract --file="$archive" --directory="$staging" --no-same-owner --no-same-permissions
  [[ -f $staging/checksums && -f $staging/database.dump && -f $staging/migrations ]] ||
    fail "$archive lacks a part that every backup has; nothing was changed."
  (cd "$staging" && sha256sum --quiet --check checksums) ||
    fail "$archive is damaged: a part of it does not match its checksum. Nothing was changed."
}

require_known_migrations() {
  local name
  while IFS= read -r name; do
    [[ -z $name || -f $root/migrations/$name.ts ]] ||
      fail "this backup was made by a newer Panelwright (it has been through $name)." "Bring the program up to date first."
  done <"$staging/migrations"
}

protect_what_is_there() {
  local tables safety
  tables=$(query "select count(*) from pg_tables where schemaname not in ('pg_catalog', 'information_schema')")
  if ((tables == 0)); then return 0; fi
  [[ $replace == yes ]] ||
    fail "the database already holds something ($tables tables)." \
      "To put the backup in its place: npm run restore -- FILE --replace (what is there is backed up first)."
  safety=$data_folder/backups/before-restore-$(date -u +%Y%m%dT%H%M%SZ).tar
  say "First a backup of what is there now."
  bash "$root/scripts/backup.sh" "$safety" || fail "what is there now could not be backed up; nothing was changed."
}

# One transaction: the database is the old one or the restored one, never something between.
restore_database() {
  pg_restore --list "$staging/database.dump" |
    grep -vE ' (SCHEMA - public|COMMENT - SCHEMA public) ' >"$staging/contents"
  {
    cat <<'SQL'
do $$ declare found name; begin
  for found in select nspname from pg_namespace where nspname !~ '^pg_' and nspname <> 'information_schema' loop
    execute format('drop schema %I cascade', found);
  end loop;
end $$;
create schema public;
SQL
    pg_restore --no-owner --no-privileges --use-list="$staging/contents" --file=- "$staging/database.dump"
  } >"$staging/restore.sql"
  psql -X -q -v ON_ERROR_STOP=1 --single-transaction --file="$staging/restore.sql" >/dev/null ||
    fail "the database refused the backup (the reason is above); it is as it was."
}

restore_files_and_secrets() {
  mv "$data_folder/files" "$staging/files.before"
  mv "$staging/files" "$data_folder/files"
  chmod 700 "$data_folder/files"
  if [[ -f $staging/secrets/session-secret ]]; then write_secret session-secret "$(cat "$staging/secrets/session-secret")"; fi
  if [[ -f $staging/secrets/demo-people.json ]]; then
    cp "$staging/secrets/demo-people.json" "$data_folder/demo-people.json"
    chmod 600 "$data_folder/demo-people.json"
  fi
}

read_arguments "$@"
require_node
read_settings_file
prepare_data_folder
lock_data_folder "Panelwright is running with these data." "Stop it (Ctrl-C where it runs), then restore."
mkdir -p "$data_folder/backups"
need_disk "$data_folder" 300 "for the restore"
unpack
require_known_migrations
connect
protect_what_is_there
restore_database
restore_files_and_secrets
say "Restored from $archive. \`npm start\` brings it up."
