// Stands in for VS Code's native logger, which would have to be compiled. The Output view shows what this writes to files.
const fs = require('node:fs');
const path = require('node:path');

const NAMES = ['trace', 'debug', 'info', 'warning', 'error', 'critical'];

class Logger {
  constructor(file) {
    this.file = file;
    this.level = NAMES.indexOf('info');
    this.plain = false;
  }

  write(level, message) {
    if (level < this.level || !this.file) return;
    const time = new Date().toISOString().replace('T', ' ').slice(0, 23);
    fs.appendFileSync(this.file, this.plain ? message : `${time} [${NAMES[level]}] ${message}\n`);
  }

  trace(message) {
    this.write(0, message);
  }
  debug(message) {
    this.write(1, message);
  }
  info(message) {
    this.write(2, message);
  }
  warn(message) {
    this.write(3, message);
  }
  error(message) {
    this.write(4, message);
  }
  critical(message) {
    this.write(5, message);
  }

  getLevel() {
    return this.level;
  }
  setLevel(level) {
    this.level = level;
  }
  setPattern() {
    this.plain = false;
  }
  clearFormatters() {
    this.plain = true;
  }
  flush() {} // Every line is written at once.
  drop() {
    this.file = undefined;
  }
}

async function createLogger(_name, file) {
  fs.mkdirSync(path.dirname(file), { recursive: true });
  return new Logger(file);
}

exports.version = 0;
exports.setLevel = () => {};
exports.setFlushOn = () => {};
exports.Logger = Logger;
exports.createRotatingLogger = createLogger;
exports.createAsyncRotatingLogger = createLogger;
