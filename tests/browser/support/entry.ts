import { expect, type Locator, type Page } from '@playwright/test';
import type { RecordEntry } from '../../../shared/contracts/commands';
import type { FieldDefinition } from '../../../shared/hold-points/definition';
import { fieldOf, reviewPoint } from '../../../shared/job/review';
import type { JobState, PointState } from '../../../shared/job/state';
import { printInches } from '../../../shared/units/print-inches';
import { siteLocal } from '../../../src/components/hold-point/site-time';
import { tap } from './tap';
import { choiceOf, nameOf, startsWith, words } from './words';

/** A reading that is to be typed, with all that is known of its field. */
interface Asked {
  entry: RecordEntry;
  field: FieldDefinition;
  group: string;
  label: string;
}

/** Inches as the tape says them. */
const onTape = (typed: string): string =>
  Number.isInteger(Number(typed) * 64) ? printInches(Number(typed), 64) : typed;

const kindsTapped = new WeakMap<Page, Set<string>>();

/** Records readings one by one through the entry sheet, in whatever order it goes on to the next. */
export async function typeReadings(
  page: Page,
  state: JobState,
  point: PointState,
  entries: readonly RecordEntry[],
): Promise<void> {
  const review = reviewPoint(state, point);
  const { place } = point;
  const left = entries.map((entry): Asked => {
    const field = fieldOf(review, entry.field);
    if (!field) throw new Error(`${place.id} does not ask for ${entry.field}`);
    return { entry, field, group: nameOf(place, 'groups', field.group), label: nameOf(place, 'fields', entry.field) };
  });
  const sheet = page.getByRole('dialog');
  while (left.length > 0) {
    if (!(await sheet.isVisible())) await openField(page, left[0] as Asked);
    const at = await askedNow(sheet, left);
    if (at === -1) {
      await tap(sheet.getByRole('button', { name: words('app.close') }));
      await expect(sheet).toBeHidden();
      continue;
    }
    const [asked] = left.splice(at, 1) as [Asked];
    await answer(page, sheet, state, point, asked);
  }
  if (await sheet.isVisible()) {
    await tap(sheet.getByRole('button', { name: words('app.close') }));
    await expect(sheet).toBeHidden();
  }
}

/** Taps the reading's own line in its group. */
async function openField(page: Page, { entry, group, label }: Asked): Promise<void> {
  const row = Number(/\.(\d+)\./.exec(entry.field)?.[1] ?? 1);
  const rows = page.getByRole('region', { name: group, exact: true }).getByRole('button', { name: startsWith(label) });
  const isRow = (await rows.count()) >= row;
  await tap(isRow ? rows.nth(row - 1) : page.getByRole('button', { name: words('job.point.addRow') }).last());
  await expect(page.getByRole('dialog')).toBeVisible();
}

/** Which of the readings the sheet asks for; -1 when it is none of them. */
async function askedNow(sheet: Locator, left: readonly Asked[]): Promise<number> {
  const group = await sheet.getByRole('heading').first().innerText();
  for (const [at, one] of left.entries()) {
    if (one.group === group && (await sheet.getByText(one.label, { exact: true }).count()) > 0) return at;
  }
  return -1;
}

async function answer(page: Page, sheet: Locator, state: JobState, point: PointState, asked: Asked): Promise<void> {
  const { entry, field, label } = asked;
  if (entry.measuredBy !== null) await tick(sheet.getByRole('radio', { name: entry.measuredBy.name }));
  const control = await fill(sheet, state, point, asked);
  const button = sheet.getByRole('button', { name: /^(Record|It is right, record it)$/ });
  await expect(button, `${entry.field}: ${entry.typed} (${label})`).toBeEnabled();
  const form = await sheet.locator('form').elementHandle();
  const tapped = kindsTapped.get(page) ?? new Set();
  kindsTapped.set(page, tapped);
  const kind = `${point.place.kind} ${field.of.type}`;
  // The first of each kind at a point by finger, the others by the keyboard's own key.
  if (control === null || !tapped.has(kind)) await tap(button);
  else await control.press('Enter');
  tapped.add(kind);
  await form?.waitForElementState('hidden');
}

/** Answers by the kind of the field; hands back what the Enter key may be pressed in. */
async function fill(sheet: Locator, state: JobState, point: PointState, asked: Asked): Promise<Locator | null> {
  const { entry, field, label } = asked;
  const pick = async (name: string): Promise<Locator> => {
    const radio = sheet.getByRole('group', { name: label, exact: true }).getByRole('radio', { name, exact: true });
    await tick(radio);
    return radio;
  };
  switch (field.of.type) {
    case 'check':
      return pick(entry.typed === 'yes' ? 'Yes' : 'No');
    case 'choice':
      return pick(choiceOf(point.place, entry.field, entry.typed));
    case 'instrument': {
      const instrument = state.plan.instruments.find((one) => one.id === entry.typed);
      const radio = sheet.getByRole('radio', { name: new RegExp(`serial ${instrument?.serial}`) });
      await tick(radio);
      return radio;
    }
    case 'welders': {
      const welder = state.people.find((one) => one.accountId === entry.typed);
      await tick(sheet.getByRole('checkbox', { name: welder?.name ?? '' }));
      return null;
    }
    case 'time':
      return type(sheet.getByLabel(label, { exact: true }), siteLocal(entry.typed, state.plan.zone));
    case 'quantity':
      return type(sheet.getByLabel(label, { exact: true }), entry.unit === 'in' ? onTape(entry.typed) : entry.typed);
    default:
      return type(sheet.getByLabel(label, { exact: true }), entry.typed);
  }
}

async function type(control: Locator, typed: string): Promise<Locator> {
  await control.fill(typed);
  return control;
}

/** Ticks by the words beside it, which is where a finger goes. */
async function tick(control: Locator): Promise<void> {
  await control.check();
  await expect(control).toBeChecked();
}
