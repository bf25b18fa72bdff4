// Mocha's browser build declares itself as the global `mocha`, whose types @types/mocha knows.
declare module 'mocha/mocha.js';
