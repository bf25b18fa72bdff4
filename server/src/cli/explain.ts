import { explain as explainTopic } from '../report/explain';
import { either } from '../model/problems/problem';
import type { Command } from './command';
import { readArguments, UsageError } from './command';

export const explain: Command = {
  name: 'explain',
  summary: 'says what a gas, unit, result, input, kind or problem is',
  help: `tenuity explain TOPIC

Says what a topic is: a gas, a unit, a result, an input, a kind of declaration or of quantity, a function, a reference condition,
or the code of a problem.

  tenuity explain mean_free_path
  tenuity explain unit-mismatch`,
  run: async (args) => {
    const [topic, ...more] = readArguments(args, {}).files;
    if (topic === undefined || more.length > 0) throw new UsageError('name one topic');
    const answer = explainTopic(topic);
    if ('nearest' in answer)
      throw new UsageError(
        `there is nothing on “${topic}”${answer.nearest.length > 0 ? `; did you mean ${either(answer.nearest)}?` : ''}`,
      );
    process.stdout.write(`${answer.text}\n`);
    return Promise.resolve(0);
  },
};
