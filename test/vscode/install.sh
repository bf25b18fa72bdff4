#!/bin/sh
# A real VS Code for the tests, from npm alone. Nothing is compiled and no install script runs.
# Usage: sh test/vscode/install.sh   (does nothing while the lockfile is the one last installed)
set -eu
cd "$(dirname "$0")"
stamp=node_modules/.installed
if [ -f "$stamp" ] && cmp -s package-lock.json "$stamp"; then exit 0; fi
npm ci --ignore-scripts --no-audit --no-fund --loglevel=error
# The workbench page fetches some modules (grammar engine, terminal) below the server's own folder.
ln -sfn ../../.. node_modules/code-server/lib/vscode/node_modules
cp package-lock.json "$stamp"
