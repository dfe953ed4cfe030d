import type { Page } from 'playwright-core'

/** Two flights by tape with a landing that falls: what a stranger writes down in a stairwell. */
export const porchMeasure: readonly (readonly [box: string, typed: string])[] = [
  ['railHeight', '36'],
  ['section.depth', '1.66'],
  ['bottom.horizontal', '11'],
  ['flights[0].nosingRise', '35'],
  ['flights[0].nosingRun', '55'],
  ['flights[0].nosingRake', '65 3/16'],
  ['landings[0].length', '48'],
  ['landings[0].slopeInPerFt', '-1/8'],
  ['flights[1].nosingRise', `3' 3"`],
  ['flights[1].nosingRun', `6'`],
  ['flights[1].nosingRake', '81 7/8'],
  ['flights[1].firstRise', '6-1/2'],
  ['top.length', '12'],
  ['brackets.endDistance', '6'],
  ['brackets.maxSpacing', '48'],
  ['stock.length', '240'],
  ['stock.kerf', '1/16'],
]

export const box = (page: Page, path: string) => page.locator(`[id="input-${path}"]`)

/** Fills an empty field sheet of two flights with the measure above, as a person would from the bottom up. */
export async function takeMeasure(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Clear it and put in your own' }).click()
  await page.getByRole('button', { name: 'Add a flight' }).click()
  // Come to by keyboard each stands clear of the drawing that keeps its place at the top of a phone.
  await page.getByRole('radio', { name: 'Down the slope' }).press('Space')
  await page.getByRole('region', { name: 'Top end' }).getByRole('radio', { name: 'Level' }).press('Space')
  await page.getByText('Brackets, stock, filler, code rows, volutes').press('Enter')
  for (const extra of ['Brackets', 'Stock']) await page.getByRole('checkbox', { name: extra }).press('Space')
  for (const [path, typed] of porchMeasure) await box(page, path).fill(typed)
}
