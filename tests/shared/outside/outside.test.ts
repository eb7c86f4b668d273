import { finishingChecks } from './checks/finishing';
import { outlineChecks } from './checks/outlines';
import { plateChecks } from './checks/plate-of-14';
import { practiceChecks } from './checks/common-practice';
import { ringChecks } from './checks/ring';
import { stripChecks } from './checks/strips';
import { ROWS, saySource } from './rows';

// Figures from outside the product, typed in; ours come from the functions that it calls.
const parts = [
  plateChecks,
  ringChecks,
  outlineChecks,
  stripChecks,
  finishingChecks,
  practiceChecks,
];
const checks = new Map(parts.flatMap((part) => Object.entries(part)));

describe('the list of outside figures', () => {
  it('has a check for every row, and a row for every check', () => {
    expect([...checks.keys()].sort()).toEqual(ROWS.map(({ id }) => id).sort());
  });

  it('has every row and every check once', () => {
    expect(new Set(ROWS.map(({ id }) => id)).size).toBe(ROWS.length);
    expect(parts.flatMap((part) => Object.keys(part))).toHaveLength(checks.size);
  });

  it('names the source of every row that was read, and of no other', () => {
    for (const { mark, source } of ROWS) expect(source !== '').toBe(mark === 'read');
  });
});

describe('outside figures', () => {
  it.each(ROWS.map((row) => [row.what, saySource(row), row.id] as const))(
    '%s (%s)',
    (_what, _source, id) => {
      expect.hasAssertions();
      checks.get(id)?.();
    },
  );
});
