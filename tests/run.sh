#!/usr/bin/env bash
# Builds everything, checks the format, runs every test. Works from any folder; needs the .NET 10 SDK.
# The last line is "N passed, N failed" over the whole run; the exit code is 0 only when something ran and all of it passed.
set -euo pipefail

cd "$(dirname "${BASH_SOURCE[0]}")/.."
export DOTNET_CLI_TELEMETRY_OPTOUT=1 DOTNET_NOLOGO=1 DOTNET_CLI_UI_LANGUAGE=en DOTNET_GENERATE_ASPNET_CERTIFICATE=false

# The build tools of the SDK leave folders of random names in the temporary folder: they get one of their own, which goes with this run.
TMPDIR=$(mktemp -d "${TMPDIR:-/tmp}/memberscan-run.XXXXXX")
export TMPDIR
finish() {
  dotnet build-server shutdown --vbcscompiler >/dev/null 2>&1 || true
  rm -rf "$TMPDIR"
}
trap finish EXIT

say() { printf '%s\n' "$*" >&2; }

# need COMMAND PACKAGE: installs the package when the command is missing and that is possible here.
apt_updated=false
need() {
  command -v "$1" >/dev/null 2>&1 || add_package "'$1'" "$2"
}

# need_file PATH PACKAGE: the same for a file.
need_file() {
  [ -e "$1" ] || add_package "$1" "$2"
}

add_package() {
  if [ "$(id -u)" -ne 0 ] || ! command -v apt-get >/dev/null 2>&1; then
    say "The tests need $1 (Debian package '$2'). Install it, then run this again."
    exit 1
  fi
  say "Installing $2."
  if ! $apt_updated; then apt-get update -qq >&2; apt_updated=true; fi
  DEBIAN_FRONTEND=noninteractive apt-get install -y -qq --no-install-recommends "$2" >&2
}

if ! command -v dotnet >/dev/null 2>&1; then
  say "The tests need the .NET 10 SDK ('dotnet'). Install it, then run this again."
  exit 1
fi
need chromium chromium
need node nodejs
need npm npm
need g++ g++
need_file /usr/sbin/nats-server nats-server
need_file /usr/include/ifcpp/reader/ReaderSTEP.h libifcplusplus-dev
need_file /usr/include/boost/unordered_map.hpp libboost-dev

bash tests/ifcplusplus/build.sh .artifacts/ifcplusplus

for folder in tests/web-ifc tests/MemberScan.Browser.Tests/types; do
  (cd "$folder" && npm ci --loglevel=error --no-audit --no-fund --no-update-notifier)
done

locked=()
if [ "${CI:-}" = true ]; then locked=(--locked-mode); fi
dotnet restore MemberScan.sln "${locked[@]}"
dotnet build MemberScan.sln --no-restore

format=0
dotnet format MemberScan.sln --verify-no-changes --no-restore || format=$?
if [ "$format" -ne 0 ]; then say "The format differs: run 'dotnet format MemberScan.sln'."; fi

log=$(mktemp)
rc=0
dotnet test MemberScan.sln --no-build 2>&1 | tee "$log" || rc=$?

if [ "$format" -ne 0 ]; then say "The format differs (see above): the run fails whatever the tests say."; fi
awk -v rc="$rc" -v format="$format" '
  /^ *(Passed|Failed|Skipped)! +- Failed:/ {
    gsub(/[:,]/, " ")
    for (i = 1; i < NF; i++) {
      if ($i == "Failed") failed += $(i + 1)
      if ($i == "Passed") passed += $(i + 1)
      if ($i == "Skipped") skipped += $(i + 1)
    }
  }
  END {
    printf "%d skipped\n", skipped
    printf "%d passed, %d failed\n", passed, failed
    exit (rc || format || failed || passed + failed == 0) ? 1 : 0
  }' "$log"
