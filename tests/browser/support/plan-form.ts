import { expect, type Page } from '@playwright/test';
import { tap } from './tap';

/** Fills the form of a new job as a coordinator does, top to bottom, and plans it; answers with the job's id. */
export async function planJob(page: Page, well: string): Promise<string> {
  await tap(page.getByRole('button', { name: 'New job' }));
  await page.getByLabel('Operator', { exact: true }).selectOption({ label: 'Marrow Creek Resources' });
  await expect(page.getByLabel('Rig', { exact: true })).toHaveValue(/./);
  await page.getByLabel('Well', { exact: true }).fill(well);
  await page.getByRole('combobox', { name: 'Casing', exact: true }).click();
  await page.getByRole('searchbox', { name: 'Search' }).fill('9 5/8 40 J55');
  await page.getByRole('option', { name: /9 5[/⁄]8 in, 40 lb\/ft, J55/ }).click();
  await page.getByLabel('Head', { exact: true }).selectOption({ label: '11 in 3000 on 9-5/8, one seal' });
  await page.getByRole('radio', { name: 'Top flange face' }).check();
  await page.getByLabel('Target height of the datum above ground').fill('6');
  await page.getByLabel('Stand-off left at the shoulder').fill('1/4');
  await page.getByLabel('Valve direction, proposed').fill('mud tanks');
  await page.getByLabel('Procedure', { exact: true }).selectOption({ label: 'SOW-104 revision C' });
  await page.getByLabel('Test pressure', { exact: true }).fill('1500');
  await page.getByLabel('Hold time', { exact: true }).fill('15');
  await page.getByLabel('Allowed drop', { exact: true }).fill('75');
  for (const name of [/^W\. Calder/, /^L\. Amaro/, /^O\. Brandt/, /^T\. Rhule/])
    await page.getByRole('checkbox', { name }).check();
  for (const serial of ['GM-2207', 'TP-014', 'LV-031', 'PY-118', 'PG-302'])
    await page.getByRole('checkbox', { name: new RegExp(serial) }).check();
  await tap(page.getByRole('button', { name: 'Plan the job' }));
  await expect(page.getByRole('heading', { level: 1, name: well })).toBeVisible();
  await expect(page).toHaveURL(/\/jobs\/[0-9a-f-]{36}$/);
  return page.url().split('/').at(-1) ?? '';
}
