#!/usr/bin/env bash
# What a pipeline runs on a pull request: compares the assembly on the branch with the one on the target branch.
# Needs BASE (a git revision), ASSEMBLY (a path in the repository) and boltup on the path. Writes compare/comparison.md, which the pipeline
# posts as a comment, and ends with 1 when a level rises by more than 0.5 dB or a target is lost, with 2 when an input is wrong.
set -uo pipefail
: "${BASE:?a git revision such as origin/main}" "${ASSEMBLY:?such as configs/minibus.assembly.yaml}"
before=$(mktemp -d)
trap 'git worktree remove --force "$before"' EXIT
git worktree add --quiet --detach "$before" "$BASE" || exit 2
boltup compare "$before/$ASSEMBLY" "$ASSEMBLY" --tolerance 0.5 --markdown -o compare
