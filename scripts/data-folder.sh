# shellcheck shell=bash disable=SC2154  # $root and the like come from the script that sources this
# The data folder: secrets, uploaded files, dumps and the local database. Sourced after messages.sh.
# Reads $root (the checkout) and PANELWRIGHT_DATA_DIR.

data_folder=""
secrets_folder=""

# Takes settings from a file `.env` beside package.json; what the environment already says wins.
read_settings_file() {
  local line name value
  [[ -f $root/.env ]] || return 0
  while IFS= read -r line || [[ -n $line ]]; do
    [[ $line =~ ^[[:space:]]*([A-Z_]+)=(.*)$ ]] || continue
    name=${BASH_REMATCH[1]}
    value=${BASH_REMATCH[2]}
    if [[ $value =~ ^\"(.*)\"$ || $value =~ ^\'(.*)\'$ ]]; then value=${BASH_REMATCH[1]}; fi
    if [[ -z ${!name:-} && -n $value ]]; then export "$name=$value"; fi
  done <"$root/.env"
}

prepare_data_folder() {
  local given=${PANELWRIGHT_DATA_DIR:-.data} folder
  case $given in
    /*) data_folder=$given ;;
    *) data_folder=$root/$given ;;
  esac
  if [[ ! -d $data_folder ]]; then
    mkdir -p "$data_folder" 2>/dev/null ||
      fail "the data folder $data_folder cannot be made." \
        "Give yourself the right to write there, or choose another with PANELWRIGHT_DATA_DIR=/some/folder."
    # The database runs as another user when this script runs as root, and must be able to pass through.
    if ((EUID == 0)); then chmod 711 "$data_folder"; else chmod 700 "$data_folder"; fi
  fi
  [[ -w $data_folder ]] ||
    fail "the data folder $data_folder cannot be written to." \
      "It is owned by $(stat -c %U "$data_folder"), you are $(id -un); or its disk is read-only." \
      "Start as the same user as before, or choose another folder with PANELWRIGHT_DATA_DIR=/some/folder."
  secrets_folder=$data_folder/secrets
  for folder in "$secrets_folder" "$data_folder/files" "$data_folder/dumps"; do
    mkdir -p "$folder"
    chmod 700 "$folder"
  done
  export PANELWRIGHT_DATA_DIR=$data_folder
}

# One run at a time in a data folder. The lock is freed by the system however this process ends.
lock_data_folder() {
  exec 9>"$data_folder/lock"
  flock -n 9 || fail "$1" "${@:2}"
}

# write_secret NAME VALUE: readable by this user alone, and never half written.
write_secret() {
  local target=$secrets_folder/$1
  (umask 077 && printf '%s\n' "$2" >"$target.new")
  mv "$target.new" "$target"
}

# Makes a random secret of 64 hexadecimal digits where there is none yet.
ensure_secret() {
  local target=$secrets_folder/$1
  if [[ ! -s $target ]]; then write_secret "$1" "$(od -An -N32 -tx1 /dev/urandom | tr -d ' \n')"; fi
  chmod 600 "$target"
}

read_secret() {
  cat "$secrets_folder/$1"
}

# need_disk FOLDER MEGABYTES WHAT-FOR
need_disk() {
  local free
  free=$(df -Pm "$1" | awk 'NR == 2 { print $4 }')
  ((free >= $2)) ||
    fail "the disk is too full: $free MB free where $1 lies, $2 MB needed $3." "Free some space and start again."
}
