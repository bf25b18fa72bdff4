import { startNodeServer } from './lsp/nodeServer';

startNodeServer();
