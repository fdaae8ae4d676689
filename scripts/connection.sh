# shellcheck shell=bash disable=SC2154  # $root and the like come from the script that sources this
# Reaching the database with PostgreSQL's own programs. Sourced after cluster.sh.

# Sets the libpq variables for an address, so that no password shows in the list of processes.
use_database() {
  local line
  # shellcheck disable=SC2016  # the dollars are JavaScript's
  while IFS= read -r line; do
    export "${line?}"
  done < <(node -e '
    const url = new URL(process.argv[1]);
    const set = (name, value) => console.log(`${name}=${decodeURIComponent(value)}`);
    set("PGHOST", url.hostname);
    set("PGPORT", url.port || "5432");
    set("PGUSER", url.username);
    set("PGPASSWORD", url.password);
    set("PGDATABASE", url.pathname.slice(1));
    if (url.searchParams.has("sslmode")) set("PGSSLMODE", url.searchParams.get("sslmode"));
  ' "$1")
}

# The database of DATABASE_URL, or else the local one, started for this run where it is not running.
connect() {
  if [[ -n ${DATABASE_URL:-} ]]; then
    ensure_postgres_client
    use_database "$DATABASE_URL"
  else
    start_cluster
    PATH=$postgres_programs:$PATH
    use_database "$cluster_url"
  fi
  query "select 1" >/dev/null || fail "the database cannot be reached (its own words are above)."
}

query() {
  psql -X -q -At -v ON_ERROR_STOP=1 -c "$1"
}

# A path given on the command line counts from where the person stands; npm moves to the checkout.
path_as_given() {
  case $1 in
    /*) printf '%s' "$1" ;;
    *) printf '%s/%s' "${INIT_CWD:-$PWD}" "$1" ;;
  esac
}
