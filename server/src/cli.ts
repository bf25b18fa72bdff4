#!/usr/bin/env node
import { run } from './cli/run';

void run(process.argv.slice(2)).then((code) => {
  process.exitCode = code;
});
