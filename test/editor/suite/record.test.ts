import * as vscode from 'vscode';
import { equal, match, notEqual, ok } from './assert';
import {
  diagnosticAppears,
  diagnosticVanishes,
  hintsOf,
  hoverAt,
  openRecord,
  placeOf,
  quickFixes,
  startTenuity,
} from './records';

const PRESSURE = /pressure = 3 ([µmhkM]?(Pa|bar|Torr)|mmHg|inHg|atm|at|psia?)\n/;
const LENGTH = /\d (nm|µm|mm|cm|m)(?!\w)/;

describe('a record in the editor', () => {
  before(startTenuity);

  it('is a gas-state file', async () => {
    const document = await openRecord('lock.gas');
    equal(document.languageId, 'tenuity', 'language');
  });

  it('shows figures beside a state, and others when an input changes', async () => {
    const document = await openRecord('lock.gas');
    const before = await hintsOf(document);
    match(before, LENGTH, 'a length with its unit among the hints');

    await replace(document, placeOf(document, '3e-3 mbar'), '3e-2 mbar');
    notEqual(await hintsOf(document), before, 'hints after the pressure rose tenfold');
  });

  it('explains a state where the pointer rests on its name', async () => {
    const document = await openRecord('lock.gas');
    match(await hoverAt(document, placeOf(document, 'residual')), /mean[ _]free[ _]path/i, 'hover');
  });

  it('flags a length where a pressure is wanted, and puts the unit that was meant', async () => {
    const document = await openRecord('slip.gas');
    const diagnostic = await diagnosticAppears(document, 'unit-mismatch');
    ok(diagnostic.range.intersection(placeOf(document, '3 mm')), 'the diagnostic at the faulty quantity');
    equal(diagnostic.severity, vscode.DiagnosticSeverity.Error, 'severity');
    const before = await hintsOf(document);

    const [fix] = await quickFixes(document, diagnostic.range);
    ok(fix?.edit, 'a quick fix');
    ok(await vscode.workspace.applyEdit(fix.edit), 'the fix is applied');
    match(document.getText(), PRESSURE, 'text after the fix');

    await diagnosticVanishes(document, 'unit-mismatch');
    const after = await hintsOf(document);
    match(after, LENGTH, 'a length with its unit among the hints');
    notEqual(after, before, 'hints after the fix');
  });
});

async function replace(document: vscode.TextDocument, place: vscode.Range, text: string): Promise<void> {
  const edit = new vscode.WorkspaceEdit();
  edit.replace(document.uri, place, text);
  ok(await vscode.workspace.applyEdit(edit), 'the edit is applied');
}
