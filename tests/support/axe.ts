import { readFileSync } from 'node:fs';

import type { AxeResults, NodeResult } from 'axe-core';
import type { Page } from 'playwright-core';

const SOURCE = readFileSync(require.resolve('axe-core/axe.min.js'), 'utf8');

export interface AxeFindings {
  /** one line a node: rule, place, why */
  violations: string[];
  /** nodes whose contrast axe could not work out by itself */
  unsureContrasts: number;
}

/** Runs every rule of axe-core over the whole page, but for level AAA and its own trial rules. */
export async function runAxe(page: Page): Promise<AxeFindings> {
  // over the debugger's own road: the content policy refuses a script tag
  if (!(await page.evaluate('"axe" in window'))) await page.evaluate(SOURCE);
  const results = (await page.evaluate(RUN)) as AxeResults;
  const lines = (rule: { id: string; nodes: NodeResult[] }) =>
    rule.nodes.map(
      ({ target, failureSummary, html }) =>
        `${rule.id}: ${target.join(' ')} | ${failureSummary ?? ''} | ${html.slice(0, 200)}`,
    );
  const unsure = results.incomplete.filter(({ id }) => id === 'color-contrast');
  return {
    violations: results.violations.flatMap(lines),
    unsureContrasts: unsure.reduce((sum, { nodes }) => sum + nodes.length, 0),
  };
}

// The rules that axe leaves out unless asked (the target size of WCAG 2.2) are asked for too.
const RUN = `axe.run(document, {
  resultTypes: ['violations', 'incomplete'],
  rules: Object.fromEntries(
    axe
      .getRules()
      .filter(({ tags }) => !['wcag2aaa', 'experimental', 'deprecated'].some((tag) => tags.includes(tag)))
      .map(({ ruleId }) => [ruleId, { enabled: true }]),
  ),
})`;
