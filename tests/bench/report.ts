/** One line of the table; `most` is the target, none where a figure is only told. */
export interface Figure {
  name: string;
  value: number;
  unit: 'ms' | 'KiB' | '';
  most?: number;
}

/** The value that the given share of the sorted values do not go over. */
export function percentile(values: readonly number[], share: number): number {
  const sorted = [...values].sort((one, other) => one - other);
  const value = sorted[Math.max(0, Math.ceil(sorted.length * share) - 1)];
  if (value === undefined) throw new Error('nothing was measured');
  return value;
}

/** Prints the figures under each other. @returns whether every target was met */
export function report(title: string, figures: readonly Figure[]): boolean {
  const width = Math.max(...figures.map(({ name }) => name.length));
  console.log(`\n${title}`);
  for (const { name, value, unit, most } of figures) {
    const shown = `${Number.isInteger(value) ? value : value.toFixed(2)} ${unit}`.padStart(12);
    const target = most === undefined ? '' : `at most ${most} ${unit}`.padEnd(20);
    const verdict = most === undefined ? '' : value <= most ? 'met' : 'MISSED';
    console.log(`  ${name.padEnd(width)} ${shown}  ${target}${verdict}`);
  }
  return figures.every(({ value, most }) => most === undefined || value <= most);
}
