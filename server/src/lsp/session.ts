import type { Connection } from 'vscode-languageserver';
import type { Abilities } from './abilities';
import type { Documents } from './documents';
import type { Guard } from './guard';
import type { Runtime } from './runtime';
import type { Settings } from './settings';

/** What is kept between requests: the texts, the settings, and what the client can do. */
export interface Session {
  readonly connection: Connection;
  readonly runtime: Runtime;
  readonly guard: Guard;
  readonly documents: Documents;
  settings: Settings;
  abilities: Abilities;
  /** The folders of the workspace. */
  folders: readonly string[];
}
