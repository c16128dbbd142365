#!/usr/bin/env bash
# Walks through the review of a mount change and checks every step. Exit code 1 if one of them is not as the README tells.
set -uo pipefail
cd "$(dirname "$0")/../.."
boltup() { dotnet run --no-build -c Release --project src/Boltup.Cli -- "$@"; }
here=examples/review out=out/review status=0
rm -rf "$out" && mkdir -p "$out"
expect() { # words, wanted exit code, found exit code
    if [ "$2" -eq "$3" ]; then echo "ok: $1"; else echo "FAILED: $1: exit code $3, expected $2"; status=1; fi
}

boltup compare "$here/main" "$here/reformatted" > "$out/reformatted.txt"
expect "a reformatted copy is no difference" 0 $?
grep -q "^The inputs are identical.$" "$out/reformatted.txt" || { echo "FAILED: the reformatted copy differs"; cat "$out/reformatted.txt"; status=1; }

boltup compare "$here/main" "$here/branch" --markdown > "$out/comment.md"
expect "the steering column gets worse" 1 $?

# The last line names the version of the program.
diff <(grep -v '^<sub>' "$here/comment.md") <(grep -v '^<sub>' "$out/comment.md") || { echo "FAILED: the comment is not the one in $here/comment.md"; status=1; }

boltup compare "$here/main" "$here/branch" --tolerance 2 > /dev/null
expect "a tolerance of 2 dB lets it pass" 0 $?

boltup pin "$here/branch/minibus.assembly.yaml" > /dev/null
expect "the pins are those of the data" 0 $?

# A measurement that is exchanged behind the reviewer's back.
mkdir -p "$out/exchanged/data"
cp examples/minibus/forces/5400rpm.csv "$out/exchanged/data/forces.csv"
sed -e 's#\.\./\.\./minibus/forces/5400rpm.csv#data/forces.csv#' "$here/main/minibus.assembly.yaml" > "$out/exchanged/minibus.assembly.yaml"
boltup pin "$out/exchanged/minibus.assembly.yaml" > /dev/null
expect "the forces are pinned" 0 $?
sed -i '2s/,[^,]*$/,0.5/' "$out/exchanged/data/forces.csv"
boltup check "$out/exchanged/minibus.assembly.yaml" > /dev/null 2> "$out/exchanged.txt"
expect "an exchanged data file is an error" 2 $?
grep -q "PLN090" "$out/exchanged.txt" || { echo "FAILED: the exchanged file is not named"; cat "$out/exchanged.txt"; status=1; }
exit $status
