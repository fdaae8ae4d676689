# shellcheck shell=bash disable=SC2154  # $root and the like come from the script that sources this
# The project's own PostgreSQL cluster: made at the first start, on loopback only, run by a user who is
# not root. Sourced after messages.sh, data-folder.sh and prerequisites.sh.

database_name=${PANELWRIGHT_DATABASE_NAME:-panelwright}
database_user=panelwright
cluster_folder=""
cluster_port=""
started_cluster=no

# The server refuses to run as root; Debian's package brings the user `postgres` for it.
as_database_user() {
  if ((EUID == 0)); then (cd / && runuser -u postgres -- "$@"); else "$@"; fi
}

# The cluster lies in the data folder, or under /var/lib where the database's user cannot pass through a
# parent of it (a checkout under /root, a home folder closed to others). The choice is written down once,
# with the data folder it was made for, so that a copied checkout does not share its original's database.
choose_cluster_folder() {
  local record=$data_folder/database-folder recorded_for="" recorded="" name
  if [[ -f $record ]]; then { read -r recorded_for && read -r recorded; } <"$record" || true; fi
  if [[ $recorded_for == "$data_folder" && -n $recorded ]]; then
    cluster_folder=$recorded
    return 0
  fi
  if as_database_user test -x "$data_folder"; then
    cluster_folder=$data_folder/postgres
  else
    name=$(printf '%s' "$data_folder" | sha256sum | cut -c 1-16)
    cluster_folder=/var/lib/panelwright/$name/postgres
    say "The user postgres cannot reach $data_folder; the database goes to $cluster_folder."
  fi
  printf '%s\n%s\n' "$data_folder" "$cluster_folder" >"$record"
}

port_is_free() {
  node -e '
    const server = require("node:net").createServer();
    server.once("error", () => process.exit(1));
    server.listen(Number(process.argv[1]), "127.0.0.1", () => server.close());
  ' "$1"
}

free_port() {
  node -e '
    const server = require("node:net").createServer();
    server.listen(0, "127.0.0.1", () => { console.log(server.address().port); server.close(); });
  '
}

create_cluster() {
  local password_file fresh=$cluster_folder.new
  need_disk "$data_folder" 300 "for the database"
  say "Making the database in $cluster_folder."
  ensure_secret database-superuser-password
  ensure_secret database-password
  rm -rf "$fresh"
  [[ -d ${cluster_folder%/*} ]] || install -d -m 711 "${cluster_folder%/*}" ||
    fail "the folder ${cluster_folder%/*} cannot be made."
  install -d -m 700 "$fresh"
  password_file=$(mktemp -p "${cluster_folder%/*}")
  read_secret database-superuser-password >"$password_file"
  if ((EUID == 0)); then chown postgres "$fresh" "$password_file"; fi
  as_database_user "$postgres_programs/initdb" --pgdata="$fresh" --username=postgres --pwfile="$password_file" \
    --auth=scram-sha-256 --encoding=UTF8 --locale=C.UTF-8 >"$data_folder/initdb.log" 2>&1 || {
    rm -f "$password_file"
    fail "the database could not be made." "$(tail -n 5 "$data_folder/initdb.log")"
  }
  rm -f "$password_file"
  as_database_user tee -a "$fresh/postgresql.conf" >/dev/null <<'SETTINGS'

# Loopback only, and no socket file, whose path could be too long.
listen_addresses = '127.0.0.1'
unix_socket_directories = ''
SETTINGS
  mv "$fresh" "$cluster_folder"
}

cluster_is_running() {
  as_database_user "$postgres_programs/pg_ctl" status -D "$cluster_folder" >/dev/null 2>&1
}

# "PID TICKS": a process told apart from a later one with the same number by when it began. The name of the
# process, second in the file, may hold spaces and brackets; what is wanted comes after its last bracket.
process_mark() {
  printf '%s %s' "$1" "$(sed 's/.*) //' "/proc/$1/stat" 2>/dev/null | awk '{ print $20 }')"
}

# A cluster left over by a run that was killed has no owner any more; this run takes it over and stops it
# at its end. One that somebody else still holds stays theirs.
take_over_if_orphaned() {
  local owner=""
  if [[ -f $data_folder/database-owner ]]; then owner=$(cat "$data_folder/database-owner"); fi
  [[ $owner == "kept" ]] && return 0
  if [[ -z $owner || $(process_mark "${owner%% *}") != "$owner" ]]; then
    started_cluster=yes
    process_mark $$ >"$data_folder/database-owner"
  fi
}

pick_cluster_port() {
  local kept=$data_folder/database-port
  cluster_port=""
  if [[ -s $kept ]]; then cluster_port=$(cat "$kept"); fi
  if [[ -z $cluster_port ]] || ! port_is_free "$cluster_port"; then
    cluster_port=$(free_port)
    printf '%s\n' "$cluster_port" >"$kept"
  fi
}

launch_cluster() {
  local attempt log=$cluster_folder/server.log options
  for attempt in 1 2 3; do
    pick_cluster_port
    options="-p $cluster_port"
    # A throw-away database need not survive a power cut.
    if [[ -f $data_folder/throw-away ]]; then options+=" -c fsync=off -c full_page_writes=off -c synchronous_commit=off"; fi
    if as_database_user "$postgres_programs/pg_ctl" start -D "$cluster_folder" -w -t 60 -l "$log" -o "$options" \
      >/dev/null 2>&1 9>&-; then
      return 0
    fi
    # Somebody may have taken the port since it was found free; any other cause will not mend by itself.
    as_database_user tail -n 20 "$log" 2>/dev/null | grep -q "Address already in use" || break
    rm -f "$data_folder/database-port"
  done
  need_disk "$data_folder" 50 "by the database"
  fail "the database did not start (attempt $attempt). Its last words:" \
    "$(as_database_user tail -n 12 "$log" 2>/dev/null)" "The whole log is $log."
}

# A command of PostgreSQL's own user in the cluster, the password out of sight of `ps`.
superuser_psql() {
  PGPASSWORD=$(read_secret database-superuser-password) "$postgres_programs/psql" -X -q -v ON_ERROR_STOP=1 \
    -h 127.0.0.1 -p "$cluster_port" -U postgres -d postgres "$@"
}

ensure_database() {
  local found
  found=$(superuser_psql -At -c "select 1 from pg_database where datname = '$database_name'") ||
    fail "the database does not let its owner in." \
      "The passwords in $secrets_folder do not belong to the database in $cluster_folder." \
      "Put the folder 'secrets' of the same backup or checkout back, then start again."
  [[ $found == 1 ]] && return 0
  superuser_psql <<SQL
do \$\$ begin
  if not exists (select from pg_roles where rolname = '$database_user') then
    create role $database_user login password '$(read_secret database-password)';
  end if;
end \$\$;
create database $database_name owner $database_user;
SQL
}

# Leaves cluster_url set and the cluster running; started_cluster says whether this run has to stop it.
start_cluster() {
  local version
  ensure_postgres
  choose_cluster_folder
  version=$(as_database_user cat "$cluster_folder/PG_VERSION" 2>/dev/null || true)
  if [[ -z $version ]]; then create_cluster; else ensure_postgres "$version"; fi
  if cluster_is_running; then
    cluster_port=$(as_database_user sed -n 4p "$cluster_folder/postmaster.pid")
    take_over_if_orphaned
  else
    launch_cluster
    started_cluster=yes
    process_mark $$ >"$data_folder/database-owner"
  fi
  ensure_database
  cluster_url="postgres://$database_user:$(read_secret database-password)@127.0.0.1:$cluster_port/$database_name"
  write_secret database-url "$cluster_url"
}

stop_cluster() {
  as_database_user "$postgres_programs/pg_ctl" stop -D "$cluster_folder" -m fast -w -t 60 >/dev/null 2>&1 || true
  rm -f "$data_folder/database-owner"
  started_cluster=no
}

stop_own_cluster() {
  if [[ $started_cluster == yes ]]; then stop_cluster; fi
}

# Only a data folder that was marked when it was made can be thrown away.
throw_cluster_away() {
  [[ -f $data_folder/throw-away ]] || fail "$data_folder is no throw-away data folder; nothing was removed."
  if [[ -n $cluster_folder && -n $postgres_programs ]]; then stop_cluster; fi
  if [[ $cluster_folder == /var/lib/panelwright/*/postgres ]]; then rm -rf "${cluster_folder%/postgres}"; fi
  rm -rf "$data_folder"
}
