import type { SignatureHelp as ProtocolHelp } from 'vscode-languageserver';
import type { SignatureHelp } from '../../features/signatureHelp';
import type { Abilities } from '../abilities';
import { toMarkup } from './markup';

export function toSignatureHelp(
  { usage, meaning, parameters, active }: SignatureHelp,
  { labelOffsets, markdownSignature }: Abilities,
): ProtocolHelp {
  return {
    signatures: [
      {
        label: usage,
        documentation: toMarkup(meaning, { markdown: markdownSignature }),
        parameters: parameters.map(({ start, end }) => ({
          label: labelOffsets ? [start, end] : usage.slice(start, end),
        })),
      },
    ],
    activeSignature: 0,
    activeParameter: Math.min(active, Math.max(0, parameters.length - 1)),
  };
}
