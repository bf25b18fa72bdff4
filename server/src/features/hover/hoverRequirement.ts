import { describeVerdict } from '../../model/requirement';
import type { Side, Verdict } from '../../model/values';
import type { RequireDeclaration } from '../../syntax/nodes';
import { showAlternative, showFigure } from '../describe/describe';
import { describePercent } from '../describe/describePercent';
import { describeStatus } from '../describe/describeStatus';
import { noValueNote } from './hoverOutcome';
import { budgetNote } from './hoverFigures';
import { bold, code, paragraphs, plainText, shortened, table } from './hoverMarkdown';
import type { HoverPlace } from './hoverPlace';
import { hoverWord } from './hoverWord';

/** A requirement: whether it holds and by how much, both sides, and what its tolerance consists of. */
export function hoverRequirement(node: RequireDeclaration, place: HoverPlace): string | undefined {
  const { analysis, declared, detail } = place;
  const { text, doc } = declared.item;
  const condition = code(shortened(text.slice(node.condition.span.start, node.condition.span.end), 300));
  const outcome = analysis.outcome(declared);
  const verdict = outcome.kind === 'value' && outcome.value.kind === 'verdict' ? outcome.value : undefined;
  if (!verdict) return paragraphs([hoverWord(node.word), condition, noValueNote(analysis, declared)]);
  const because = node.because?.kind === 'text' ? node.because.text : undefined;
  return paragraphs([
    `${bold(node.word.text)}, ${plainText(statusText(verdict))}`,
    condition,
    because === undefined ? undefined : plainText(shortened(because, 500)),
    doc === undefined ? undefined : plainText(shortened(doc, 2000)),
    sidesTable(verdict, place),
    ...(detail === 'full'
      ? [
          isPart(verdict, node)
            ? plainText(
                `Decided by ${shortened(describeVerdict(verdict, node.condition, text, analysis.display), 500)}`,
              )
            : undefined,
          budgetNote(analysis, verdict.leans),
        ]
      : []),
  ]);
}

/** Of a compound condition one part decides. */
function isPart({ relation }: Verdict, { condition }: RequireDeclaration): boolean {
  return relation !== undefined && (relation.start !== condition.span.start || relation.end !== condition.span.end);
}

function statusText(verdict: Verdict): string {
  if (verdict.status !== 'undecided') return describeStatus(verdict);
  const by = verdict.margin === undefined ? '' : ` by ${describePercent(Math.abs(verdict.margin))}`;
  return `undecided: the tolerances reach the limit, the best values ${verdict.holds ? 'meet' : 'miss'} it${by}`;
}

function sidesTable({ sides }: Verdict, { options }: HoverPlace): string {
  const text = ({ value, text: word }: Side) => (value ? showFigure(value, options) : word);
  return table(
    ['side', 'value', 'in other units'],
    sides.map((side, index) => [
      index === 0 ? 'found' : side.text.trim() || 'limit',
      plainText(text(side)),
      plainText((side.value && showAlternative(side.value, options)) ?? ''),
    ]),
  );
}
