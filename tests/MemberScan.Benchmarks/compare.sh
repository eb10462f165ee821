#!/usr/bin/env bash
# Measures the Part 21 engine beside other programs on generated models, one after the other in each round, whole process, file in the page
# cache. Prints seconds of each round, peak memory, and whether the answers are equal.
# Usage: compare.sh FOLDER [ROUNDS [MODEL...]]   FOLDER receives the models (1.2 GB); ROUNDS is 5 and the models are all if not given. The
# models are those of ModelRecipe; "pass" stands for the pass on one thread beside the mask scan.
set -euo pipefail

folder=${1:?Usage: compare.sh FOLDER [ROUNDS [MODEL...]]}
rounds=${2:-5}
models=("${@:3}")
[ "${#models[@]}" -gt 0 ] || models=(10mb 10mb-odd 10mb-ifc2x3 10mb-shuffled dense 100mb 1gb pass)
here=$(cd "$(dirname "${BASH_SOURCE[0]}")" && pwd)
root=$(cd "$here/../.." && pwd)
program=$folder/program/MemberScan.Benchmarks
mkdir -p "$folder"
[ -d "$root/tests/web-ifc/node_modules" ] || (cd "$root/tests/web-ifc" && npm ci --loglevel=error --no-audit --no-fund --no-update-notifier)
if [ ! -x "$program" ]; then
  dotnet publish "$here" -c Release -r linux-x64 --self-contained false -p:PublishReadyToRun=true -p:NuGetLockFilePath="$folder/publish.lock.json" -o "$folder/program" >&2
fi

# measure LABEL COMMAND...: seconds, user and system seconds, peak memory in KB; the answer goes to FOLDER/answer.LABEL.
measure() {
  local label=$1
  shift
  command time -f "$label %e %U %S %M" -o "$folder/time" "$@" >"$folder/answer.$label" 2>/dev/null
  cat "$folder/time"
}

for model in "${models[@]}"; do
  [ "$model" != pass ] || continue
  file=$folder/$model.ifc
  [ -f "$file" ] || "$program" generate "$model" "$file"
  cat "$file" >/dev/null
  echo "== $model"
  for ((round = 0; round < rounds; round++)); do
    measure grep grep -c '^#' "$file"
    measure engine "$program" question "$file"
    # The one that takes longest runs once.
    if [ "$round" -eq 0 ]; then measure web-ifc node --max-old-space-size=8000 "$root/tests/web-ifc/answer-question.mjs" "$file"; fi
    if [ "$model" = 1gb ]; then
      measure copy cp "$file" "$folder/copy.ifc"
      rm "$folder/copy.ifc"
      measure append "$program" append "$file" "$folder/appended.ifc"
      rm "$folder/appended.ifc"
    fi
  done
  if cmp -s "$folder/answer.engine" "$folder/answer.web-ifc"; then echo "answers equal"; else echo "ANSWERS DIFFER"; fi
done

[[ " ${models[*]} " == *" pass "* ]] || exit 0
echo "== pass on one thread, and the mask scan"
for ((round = 0; round < 2; round++)); do
  "$program" scan "$folder/1gb.ifc" | tail -1
  "$program" pass "$folder/1gb.ifc" 1 | tail -1
done
