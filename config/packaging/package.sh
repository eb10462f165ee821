#!/usr/bin/env bash
# Builds the ways to install and tries each: a tool package, a self-contained single file, a native program. Not part of the tests, since it takes minutes.
# Each must write the bytes that the others write. Outputs: .artifacts/packages. Needs the .NET 10 SDK, for the native program also clang or gcc and zlib1g-dev.
# Usage: package.sh [tool|single|native]...   (default: all three)
set -euo pipefail

cd "$(dirname "${BASH_SOURCE[0]}")/../.."
root=$PWD
out=$root/.artifacts/packages
export DOTNET_CLI_TELEMETRY_OPTOUT=1 DOTNET_NOLOGO=1 DOTNET_CLI_UI_LANGUAGE=en
case $(uname -m) in
  x86_64) rid=linux-x64 instructions=x86-64-v3 ;;
  aarch64) rid=linux-arm64 instructions=native ;;
  *) echo "This machine ($(uname -m)) is none that packages are made for." >&2; exit 1 ;;
esac

scratch=$(mktemp -d)
trap 'rm -rf "$scratch"' EXIT

# Restoring for one kind of machine writes other lock files: they and all else stay apart from the build of the tests.
apart=(-c Release -v q --nologo -p:PublishDocumentationFiles=false -p:ArtifactsPath="$root/.artifacts/packages-build" -p:NuGetLockFilePath="$root/.artifacts/packages-build/packages.lock.json")

# try NAME PROGRAM FILE: screens the samples with every kind of output and compares with what was written before; FILE is what a user gets.
try() {
  local folder=$scratch/$1 code=0
  "$2" screen sample-models --forces-beside --timestamp 2026-03-04T05:06:07Z --out "$folder" --set-template \
    --xlsx "$folder/*.xlsx" --parquet "$folder/*.parquet" --bcf "$folder/*.bcf" --request "$folder/*.request.html" > "$scratch/$1.log" 2>&1 || code=$?
  if [ "$code" -ne 1 ]; then cat "$scratch/$1.log"; echo "$1: exit code $code, not 1" >&2; exit 1; fi
  if [ -d "$scratch/first" ]; then diff -r "$scratch/first" "$folder"; else cp -r "$folder" "$scratch/first"; fi
  "$2" section "tube 48.3x3.2 mm" > /dev/null
  "$2" members sample-models/mast-stays.ifc > /dev/null 2>&1
  "$2" restore "$folder/gangway-rails.checked.ifc" --out "$scratch/restored" > /dev/null
  cmp "$scratch/restored/gangway-rails.restored.ifc" sample-models/gangway-rails.ifc
  echo "$1: $(find "$folder" -type f | wc -l) files as expected; $(du -k "$3" | cut -f1) KiB; start $(start "$2") ms (median of 21)"
}

# start PROGRAM: median time of 'PROGRAM --version' [ms].
start() {
  local i from to
  for i in $(seq 21); do
    from=$(date +%s%N); "$1" --version > /dev/null; to=$(date +%s%N)
    echo $(( (to - from) / 1000000 ))
  done | sort -n | sed -n 11p
}

for kind in "${@:-tool single native}"; do
  for one in $kind; do
    mkdir -p "$out/$one"
    case $one in
      tool)
        rm -f "$out"/tool/*.nupkg
        dotnet pack src/MemberScan.Cli "${apart[@]}" -p:PackAsTool=true -o "$out/tool"
        rm -rf "$scratch/tools"
        dotnet tool install MemberScan --tool-path "$scratch/tools" --source "$out/tool" --no-cache > /dev/null
        try tool "$scratch/tools/memberscan" "$(ls "$out"/tool/MemberScan.*.nupkg)"
        ;;
      single)
        dotnet publish src/MemberScan.Cli "${apart[@]}" -r "$rid" --self-contained -p:PublishSingleFile=true -p:DebugType=none -o "$out/single"
        try single "$out/single/memberscan" "$out/single/memberscan"
        ;;
      native)
        dotnet publish src/MemberScan.Cli "${apart[@]}" -r "$rid" -p:PublishAot=true -p:IlcInstructionSet="$instructions" -o "$out/native"
        try native "$out/native/memberscan" "$out/native/memberscan"
        ;;
      *) echo "'$one' is none of tool, single, native." >&2; exit 64 ;;
    esac
  done
done
