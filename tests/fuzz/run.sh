#!/usr/bin/env bash
# Coverage-guided fuzzing of both readers of Part 21 and of the untouched copy: no crash, hang or lack of memory, and no difference.
# Usage: tests/fuzz/run.sh [SECONDS]   (600 if not given)
# Needs afl-fuzz (Debian package afl++) and the .NET 10 SDK. Inputs come from tests/fuzz/corpus; what is found stands in tests/fuzz/findings.
set -euo pipefail

cd "$(dirname "${BASH_SOURCE[0]}")/../.."
seconds=${1:-600}
work=.artifacts/fuzz
if ! command -v afl-fuzz >/dev/null 2>&1; then
  echo "This needs 'afl-fuzz' (Debian package 'afl++'). Install it, then run this again." >&2
  exit 1
fi

rm -rf "$work/program" "$work/out"
mkdir -p "$work" tests/fuzz/findings
dotnet publish tests/fuzz/MemberScan.Fuzz.csproj -c Release -o "$work/program"
[ -x "$work/tools/sharpfuzz" ] || dotnet tool install SharpFuzz.CommandLine --version 2.3.0 --tool-path "$work/tools"
DOTNET_ROLL_FORWARD=Major "$work/tools/sharpfuzz" "$work/program/MemberScan.Part21.dll"

export AFL_SKIP_BIN_CHECK=1 AFL_NO_UI=1 AFL_SKIP_CPUFREQ=1 AFL_I_DONT_CARE_ABOUT_MISSING_CRASHES=1 DOTNET_TieredPGO=0
afl-fuzz -V "$seconds" -i tests/fuzz/corpus -o "$work/out" -x tests/fuzz/tokens.dict -t 10000 -m none -- dotnet "$work/program/MemberScan.Fuzz.dll"

grep -E '^(run_time|execs_done|execs_per_sec|corpus_count|corpus_found|saved_crashes|saved_hangs|bitmap_cvg)' "$work/out/default/fuzzer_stats"
find "$work/out/default/crashes" "$work/out/default/hangs" -name 'id*' -exec cp {} tests/fuzz/findings/ \;
found=$(find "$work/out/default/crashes" "$work/out/default/hangs" -name 'id*' | wc -l)
echo "$found findings"
[ "$found" -eq 0 ]
