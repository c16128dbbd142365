#!/usr/bin/env bash
# Runs the four assemblies and compares every response with the reference, line by line. Exit code 1 if a fact does not hold.
set -euo pipefail
cd "$(dirname "$0")/../.."
out=out/truth-table
boltup() { dotnet run --no-build -c Release --project src/Boltup.Cli -- "$@" > /dev/null; }
for assembly in s-on-r r-alone s-on-t t-alone; do
    boltup predict "examples/truth-table/$assembly.assembly.yaml" -o "$out/$assembly" --no-pictures
done

# Largest and smallest relative difference between two operations over all lines: FILE OPERATION REFERENCE_FILE REFERENCE_OPERATION
difference() {
    awk -F, -v op="$2" -v ref="$4" '
        NR == FNR { if ($1 == ref) { re[$3] = $4; im[$3] = $5 } ; next }
        $1 == op { d = sqrt(($4 - re[$3]) ^ 2 + ($5 - im[$3]) ^ 2) / sqrt(re[$3] ^ 2 + im[$3] ^ 2)
                   if (n++ == 0 || d < low) low = d; if (d > high) high = d }
        END { printf "%.1e %.1e", low, high }' "$out/$3/responses.csv" "$out/$1/responses.csv"
}

status=0
fact() { # words, yes or no, then the arguments of difference
    local words=$1 want=$2 low high verdict
    shift 2
    read -r low high <<< "$(difference "$@")"
    if [ "$want" = reproduces ]; then verdict=$(awk -v d="$high" 'BEGIN { print (d < 1e-10) ? "ok" : "FAILED" }')
    else verdict=$(awk -v d="$low" 'BEGIN { print (d > 0.03) ? "ok" : "FAILED" }'); fi
    [ "$verdict" = ok ] || status=1
    printf '%-46s %-13s %9s … %-9s %s\n' "$words" "$want" "$low" "$high" "$verdict"
}

printf '%-46s %-13s %s\n' "force, applied to" "expected" "difference from the reference"
fact "contact force, receiver alone" reproduces r-alone "contact force" s-on-r "internal force"
fact "contact force, coupled assembly" "does not" s-on-r "contact force" s-on-r "internal force"
fact "blocked force, coupled assembly" reproduces s-on-r "blocked force" s-on-r "internal force"
fact "blocked force, receiver alone" "does not" r-alone "blocked force" s-on-r "internal force"
fact "blocked force, source on another receiver" reproduces s-on-t "blocked force" s-on-t "internal force"
fact "first receiver's contact force, other alone" "does not" t-alone "contact force of S on R" s-on-t "internal force"
exit $status
