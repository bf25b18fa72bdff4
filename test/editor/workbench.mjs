// The workbench as a person uses it: keyboard, mouse, and what can be read on the screen.
// A string may match anywhere in a line; the workbench draws the spaces of a line as U+00A0, which a string matches too.

const NO_BREAK_SPACE = /\u00a0/g;

export async function openWorkbench(page, address) {
  await page.goto(address);
  await page.locator('.monaco-workbench').waitFor();
  await page.locator('.explorer-folders-view .monaco-list-row').first().waitFor();
}

/** By the quick-open box, which does not depend on what the explorer shows. */
export async function openFile(page, name) {
  await page.keyboard.press('Control+P');
  await page.locator('.quick-input-widget input').fill(name);
  await page.locator('.quick-input-list .monaco-list-row', { hasText: name }).first().waitFor();
  await page.keyboard.press('Enter');
  await page.getByRole('tab', { name, exact: false }).waitFor();
  await editor(page).locator('.view-line').first().waitFor();
}

/** By the command palette. */
export async function runCommand(page, title) {
  await page.keyboard.press('F1');
  await page.locator('.quick-input-widget input').fill(`>${title}`);
  await choose(page, title);
}

/** Picks an entry of the list that is open at the top. */
export async function choose(page, entry) {
  const row = page.locator('.quick-input-list .monaco-list-row', { hasText: entry }).first();
  await row.click();
  await row.waitFor({ state: 'hidden' });
}

export function editor(page) {
  return page.locator('.editor-instance .monaco-editor').first();
}

export function line(page, text) {
  return editor(page).locator('.view-line', { hasText: text }).first();
}

/** The inlay hints of a line: text put in by the editor, in a generated class. */
export function hint(page, text) {
  return line(page, text).locator('span[class*="dyn-rule-"]', { hasText: /\S/ });
}

export function squiggle(page, severity) {
  return editor(page).locator(`.squiggly-${severity}`).first();
}

export async function languageName(page) {
  return readable(await page.locator('#status\\.editor\\.mode').innerText());
}

/** Rests the pointer on a word and reads what appears. */
export async function hoverOver(page, place, { showing }) {
  const { x, y } = await wordCentre(page, place);
  await page.mouse.move(x, y, { steps: 3 });
  const hover = page.locator('.monaco-hover:not(.hidden) .hover-contents', { hasText: showing }).first();
  await hover.waitFor();
  return readable(await hover.innerText());
}

/** Puts the caret on a word. */
export async function clickOn(page, place) {
  const { x, y } = await wordCentre(page, place);
  await page.mouse.click(x, y);
}

/** Types over a word. */
export async function replaceWord(page, place, text) {
  const { x, y } = await wordCentre(page, place);
  await page.mouse.dblclick(x, y);
  await page.keyboard.type(text);
  await page.keyboard.press('Escape'); // Closes the suggestions.
}

/** Opens the menu of quick fixes at a word; returns the entries. */
export async function openQuickFixes(page, place) {
  await clickOn(page, place);
  await page.keyboard.press('Control+.');
  const entries = page.locator('.action-widget .monaco-list-row.action');
  await entries.first().waitFor();
  return entries;
}

export async function openProblems(page) {
  await page.keyboard.press('Control+Shift+M');
  await page.locator('.markers-panel').waitFor();
  return page.locator('.markers-panel .monaco-list-row');
}

/** Saves what is unsaved; ends when the tab no longer shows that something is. */
export async function save(page) {
  const tab = page.locator('.tabs-container .tab.active');
  await tab.and(page.locator('.dirty')).waitFor();
  await page.keyboard.press('Control+S');
  await tab.and(page.locator(':not(.dirty)')).waitFor();
}

export function readable(text) {
  return text.replace(NO_BREAK_SPACE, ' ').trim();
}

/** The middle of a word on the screen, wherever the colouring cuts the line into pieces. */
async function wordCentre(page, place) {
  await line(page, place.line).waitFor();
  return line(page, place.line).evaluate(centreOfWord, place.word);
}

/** Runs in the page. */
function centreOfWord(viewLine, word) {
  const SHOW_TEXT = 4;
  const walker = document.createTreeWalker(viewLine, SHOW_TEXT);
  const pieces = [];
  while (walker.nextNode()) pieces.push(walker.currentNode);
  const start = pieces
    .map((piece) => piece.data)
    .join('')
    .replace(/\u00a0/g, ' ')
    .indexOf(word);
  if (start < 0) throw new Error(`${word} is not in the line ${viewLine.innerText}`);

  const range = document.createRange();
  let passed = 0;
  for (const piece of pieces) {
    const at = (offset) => Math.min(Math.max(offset - passed, 0), piece.length);
    if (passed <= start && start < passed + piece.length) range.setStart(piece, at(start));
    if (passed < start + word.length && start + word.length <= passed + piece.length) {
      range.setEnd(piece, at(start + word.length));
    }
    passed += piece.length;
  }
  const { left, width, top, height } = range.getBoundingClientRect();
  return { x: left + width / 2, y: top + height / 2 };
}
