#!/usr/bin/env bash
# Solves the towers of the frame benchmark with our solver and with CHOLMOD, one thread each, in turn. Needs a C compiler and Debian's
# libsuitesparse-dev and libopenblas-dev (installed where that is possible here).
# Usage: run.sh [ROUNDS]
set -euo pipefail

rounds=${1:-3}
here=$(cd "$(dirname "${BASH_SOURCE[0]}")" && pwd)
root=$(cd "$here/../.." && pwd)
folder=$(mktemp -d)
trap 'rm -rf "$folder"' EXIT

if [ ! -e /usr/include/suitesparse/cholmod.h ]; then
  if [ "$(id -u)" -ne 0 ] || ! command -v apt-get >/dev/null 2>&1; then
    echo "Install libsuitesparse-dev and libopenblas-dev, then run this again." >&2
    exit 1
  fi
  apt-get update -qq >&2
  DEBIAN_FRONTEND=noninteractive apt-get install -y -qq --no-install-recommends gcc libc6-dev libsuitesparse-dev libopenblas-dev >&2
fi

gcc -O2 -o "$folder/factor" "$here/factor.c" -lcholmod -lm
dotnet build -c Release "$root/tests/MemberScan.Benchmarks" -v q --nologo >&2
program=$root/.artifacts/bin/MemberScan.Benchmarks/release/MemberScan.Benchmarks
for tower in "10 10 100" "20 20 25" "4 4 625"; do
  # shellcheck disable=SC2086
  "$program" frame-matrix $tower "$folder/matrix"
  # shellcheck disable=SC2086
  "$program" frame $tower 1 1 "$rounds"
  OPENBLAS_NUM_THREADS=1 OMP_NUM_THREADS=1 "$folder/factor" "$folder/matrix" "$rounds"
done
