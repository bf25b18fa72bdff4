#!/usr/bin/env node
import { run } from './cli/run';

// Whoever reads the output may have seen enough, as head has.
process.stdout.on('error', (error: NodeJS.ErrnoException) => {
  if (error.code !== 'EPIPE') throw error;
});

void run(process.argv.slice(2)).then((code) => {
  process.exitCode = code;
});
