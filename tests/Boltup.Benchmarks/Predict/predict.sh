#!/usr/bin/env bash
# The whole program against a NumPy script for the same job, both as processes, taking turns; needs a folder with the fine reference case.
#
#   BOLTUP_REFERENCE=FOLDER PYTHON=python3 tests/Boltup.Benchmarks/Predict/predict.sh
set -euo pipefail
cd "$(dirname "$0")/../../.."
root=$PWD
case=${BOLTUP_REFERENCE:?names the folder that holds case1-fine}/case1-fine
work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT
dotnet publish src/Boltup.Cli -c Release -r linux-x64 -o "$work/bin" -v q --nologo > /dev/null
for part in compressor body; do
    sed -e "s|../../examples/minibus/compressor.unv|$case/compressor_free.unv|" \
        -e "s|../../examples/minibus/body.unv|$case/body_free.unv|" \
        -e "s|../../examples/minibus/ears.unv|$case/body_free_ears.unv|" "configs/parts/$part.part.yaml" > "$work/$part.part.yaml"
done
grep -vE '^  (internal|contact on coupled):' tests/Boltup.Tests/Data/case1/constant.assembly.yaml \
    | sed -e 's|../../../../configs/parts/||' -e "s|../../../../examples/minibus/forces/5400rpm.csv|$case/blocked_forces_true.unv|" \
    > "$work/fine.assembly.yaml"

run() { # name, command: prints the shortest of several wall times
    local best=999999 name=$1 i ms
    shift
    for i in 1 2 3 4 5 6 7; do
        local start=$(date +%s%N)
        "$@" > "$work/log" 2>&1
        ms=$((($(date +%s%N) - start) / 1000000))
        [ "$ms" -lt "$best" ] && best=$ms
    done
    echo "$name: $best ms"
}

export OPENBLAS_NUM_THREADS=1
run "NumPy script" env -u OPENBLAS_CORETYPE -u OPENBLAS_L2_SIZE "${PYTHON:-python3}" tests/Boltup.Benchmarks/Predict/baseline_predict.py "$case" "$work/numpy"
run "boltup, no pictures" "$work/bin/boltup" predict "$work/fine.assembly.yaml" -o "$work/out" --no-pictures --allow-outside
run "boltup, 7 pictures" "$work/bin/boltup" predict "$work/fine.assembly.yaml" -o "$work/out" --allow-outside
run "boltup explain (start-up alone)" "$work/bin/boltup" explain CFG012
"$work/bin/boltup" predict "$work/fine.assembly.yaml" -o "$work/out" --no-pictures --allow-outside --timing 2>&1 > /dev/null | tail -1
