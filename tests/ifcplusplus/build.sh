#!/usr/bin/env bash
# Builds read-sets into a folder. Needs Debian's g++, libboost-dev and libifcplusplus-dev.
# Usage: build.sh FOLDER
set -euo pipefail

source="$(cd "$(dirname "${BASH_SOURCE[0]}")" && pwd)/read-sets.cpp"
target="${1:?give the folder for the program}/read-sets"
if [ "$target" -nt "$source" ]; then exit 0; fi

mkdir -p "$1"
g++ -std=c++14 -O1 -w -o "$target" "$source" -lIfcPlusPlus
