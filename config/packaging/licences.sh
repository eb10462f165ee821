#!/usr/bin/env bash
# Writes licences.md: the packages that the program consists of, with version and licence as their own descriptions say.
# Reads the lock file of the program and the packages of the last restore.
set -euo pipefail

cd "$(dirname "${BASH_SOURCE[0]}")/../.."
packages=${NUGET_PACKAGES:-$HOME/.nuget/packages}

# Name and version of each package, no project of ours and no analyzer that only builds.
awk '/^      "/ { gsub(/[": {]/, ""); name = $0; type = "" }
     /"type":/ { gsub(/[",]/, ""); type = $2 }
     /"resolved":/ { gsub(/[",]/, ""); if (type != "Project" && name !~ /Analyzers$/) print name, $2 }' src/MemberScan.Cli/packages.lock.json | LC_ALL=C sort -u |
{
  echo '# Licences of the packages in the program'
  echo
  echo 'Written by `licences.sh`. The program itself is under the licence in `LICENSE`; the .NET runtime that the self-contained forms carry is MIT.'
  echo
  echo '| package | version | licence |'
  echo '|---|---|---|'
  while read -r name version; do
    lower=$(printf %s "$name" | tr '[:upper:]' '[:lower:]')
    description="$packages/$lower/$version/$lower.nuspec"
    licence=$(sed -n 's/.*<license type="expression">\([^<]*\)<.*/\1/p' "$description" | head -1)
    if [ -z "$licence" ]; then
      file=$(sed -n 's/.*<license type="file">\([^<]*\)<.*/\1/p' "$description" | head -1 | tr '\\' '/')
      if [ -n "$file" ]; then licence="see its $file: $(grep -m1 -v '^[[:space:]]*$' "$packages/$lower/$version/$file" | tr -d '\r|' | sed 's/^[[:space:]]*//')"; fi
    fi
    if [ -z "$licence" ]; then
      address=$(sed -n 's/.*<licenseUrl>https:..\([^<?]*\).*/\1/p' "$description" | head -1)
      if [ -n "$address" ]; then licence="named by an address only: $address"; fi
    fi
    if [ -z "$licence" ]; then echo "No licence is named in $name $version." >&2; exit 1; fi
    echo "| $name | $version | $licence |"
  done
} > config/packaging/licences.md.part
mv config/packaging/licences.md.part config/packaging/licences.md
