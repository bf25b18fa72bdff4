import assert from 'node:assert/strict';
import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import type { InlayHint } from 'vscode-languageserver-protocol/node';
import type { Client, OpenFile } from './client';
import { spawnServer } from './server';

const records = ['samples', 'client/starters'].flatMap((folder) =>
  readdirSync(folder)
    .filter((name) => name.endsWith('.gas'))
    .map((name) => path.join(folder, name)),
);
const everything = { range: { start: { line: 0, character: 0 }, end: { line: 9999, character: 0 } } };
const views = ['inlayHint', 'foldingRange', 'documentSymbol', 'semanticTokens/full'];

describe('typing', () => {
  let client: Client;
  let server: Awaited<ReturnType<typeof spawnServer>>;
  before(async () => {
    const documentSymbol = { hierarchicalDocumentSymbolSupport: true };
    server = await spawnServer({ capabilities: { textDocument: { documentSymbol } } });
    client = server.client;
  });
  after(async () => {
    assert.deepEqual(
      client.messages.filter(({ method }) => method === 'window/logMessage'),
      [],
    );
    assert.equal(await server.stop(), 0);
  });

  for (const record of records) {
    it(`${record} key by key ends where opening it ends`, async () => {
      const text = readFileSync(record, 'utf8');
      const typed = client.open(`file:///typed/${record}`, '');
      const answers = keys(text).map(({ offset, key }) => {
        typed.replace(offset, offset, key);
        const position = typed.document.positionAt(offset + key.length);
        return typed.ask(key === '\n' ? 'inlayHint' : 'completion', { position, ...everything });
      });
      await Promise.all(answers);
      await endsLikeAFreshOne(typed, record);
    });

    it(`${record} taken away from its end and put back is as before`, async () => {
      const text = readFileSync(record, 'utf8');
      const file = client.open(`file:///halved/${record}`, text);
      for (let end = text.length; end > 0; end -= 1) file.replace(end - 1, end, '');
      file.replace(0, 0, text);
      await endsLikeAFreshOne(file, record);
    });
  }

  it('answers each key in a file of 2,000 lines with the values of that moment', async () => {
    const [blocks, edited] = [225, 120];
    const block = (index: number) =>
      `\nstate s${index} of N2 {\n  pressure = ${index + 1} Pa ± 10 %\n  temperature = room\n}\n` +
      `tube t${index} { bore = ${index + 10} mm, length = 1 m }\nsite at${index} = s${index} in t${index}\n` +
      `require at${index}.knudsen > 1e-6\n\n`;
    const text = `let room = 21 °C ± 2 K\n${Array.from({ length: blocks }, (_, index) => block(index)).join('')}`;
    assert.ok(text.split('\n').length > 2000);
    const file = client.open('file:///large/large.gas', text);
    assert.deepEqual(await file.problems(), []);

    const place = text.indexOf(`${edited + 1} Pa`);
    const around = { range: { start: file.at(`state s${edited}`), end: file.at(`state s${edited + 1}`) } };
    const times: number[] = [];
    const ask = async (): Promise<string> => {
      const start = performance.now();
      const [hint] = await file.ask<InlayHint[]>('inlayHint', around);
      times.push(performance.now() - start);
      return hint?.label as string;
    };
    const first = await ask();
    for (let round = 0; round < 20; round += 1) {
      file.replace(place, place, '4');
      assert.notEqual(await ask(), first);
      file.replace(place, place + 1, '');
      assert.equal(await ask(), first);
    }
    assert.deepEqual(await file.problems(), []);
    if (process.env['LATENCY'] !== undefined) console.info(describeTimes(times));
    file.close();
  });

  async function endsLikeAFreshOne(file: OpenFile, record: string): Promise<void> {
    const fresh = client.open(`file:///fresh/${record}`, readFileSync(record, 'utf8'));
    assert.deepEqual(await file.problems(), await fresh.problems());
    for (const view of views) {
      const [ours, theirs] = await Promise.all([file.ask(view, everything), fresh.ask(view, everything)]);
      assert.deepEqual(withoutName(ours), withoutName(theirs), view);
    }
    fresh.close();
    file.close();
  }
});

/** The characters of a text, surrogates together, each with its place. */
function keys(text: string): { readonly offset: number; readonly key: string }[] {
  let offset = 0;
  return Array.from(text, (key) => {
    const at = offset;
    offset += key.length;
    return { offset: at, key };
  });
}

/** Each answer has a name of its own, by which changes are told. */
function withoutName(answer: unknown): unknown {
  return typeof answer === 'object' && answer !== null && 'resultId' in answer ? { ...answer, resultId: '' } : answer;
}

function describeTimes(times: readonly number[]): string {
  const sorted = [...times].sort((a, b) => a - b);
  const at = (share: number) => (sorted[Math.floor(sorted.length * share)] ?? NaN).toFixed(1);
  return `key to hints: median ${at(0.5)} ms, 95 % ${at(0.95)} ms`;
}
