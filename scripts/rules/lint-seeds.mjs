const lines = (count) => `${'// line\n'.repeat(count)}export const a = 1;\n`;
/** [where, code, the rule that must catch it; `null`: must pass] */
export const LINT_SEEDS = [
  ...['shared/x.ts', 'sync/protocol/x.ts', 'sync/merge/x.ts'].flatMap((where) => [
    [where, 'export const a = () => Date.now();', 'no-restricted-properties'],
    [where, 'export const a = () => new Date();', 'no-restricted-syntax'],
    [where, 'export const a = () => new Date(5);', null],
    [where, 'export const a = () => Math.random();', 'no-restricted-properties'],
    [where, "export const a = () => fetch('/');", 'no-restricted-globals'],
  ]),
  ['sync/client/x.ts', 'export const a = () => Date.now();', null],
  ...['app/x.tsx', 'components/x.tsx', 'sync/store/sqlite/x.ts'].map((where) => [
    where,
    "export const a = (db: { runSync(q: string): void }) => db.runSync('x');",
    'no-restricted-syntax',
  ]),
  ['sync/store/sqlite/x.ts', "export { openDatabaseAsync } from 'expo-sqlite';", null],
  [
    'sync/store/sqlite/x.ts',
    "import { openDatabaseSync } from 'expo-sqlite';\nexport const a = openDatabaseSync;",
    'no-restricted-syntax',
  ],
  ['sync/store/x.ts', "export { openDatabaseAsync } from 'expo-sqlite';", 'no-restricted-imports'],
  ['components/x.tsx', "export { openDatabaseAsync } from 'expo-sqlite';", 'no-restricted-imports'],
  ['server/x.ts', "export { openDatabaseAsync } from 'expo-sqlite';", 'no-restricted-imports'],
  ['sync/engine/x.ts', 'export const a = (e: { startSync(): void }) => e.startSync();', null],
  ['components/x.tsx', lines(300), 'max-lines'],
  ['components/x.tsx', lines(299), null],
  ['app/x.tsx', lines(40), 'max-lines'],
  ['app/x.tsx', lines(39), null],
  ['server/x.ts', 'export const a = (b: any) => b;', '@typescript-eslint/no-explicit-any'],
  [
    'server/x.ts',
    'export const a = (b: { c?: string }) => b.c!;',
    '@typescript-eslint/no-non-null-assertion',
  ],
  ['server/x.ts', 'export enum A { B }', 'no-restricted-syntax'],
  [
    'server/x.ts',
    "import { AppUser } from './db/entities/app-user';\nexport const a = (b: AppUser) => b;",
    '@typescript-eslint/consistent-type-imports',
  ],
  ...['components/x.tsx', 'server/x.ts', 'shared/x.ts', 'sync/x.ts', 'tests/x.ts'].map((where) => [
    where,
    'export default 1;',
    'import/no-default-export',
  ]),
  ['app/x.tsx', 'const a = 1;\nexport default a;', null],
  ['server/x.ts', '// @ts-ignore\nexport const a = 1;', '@typescript-eslint/ban-ts-comment'],
  ['server/x.ts', 'export const a = (b: number) => { let c = b; return c; };', 'prefer-const'],
  [
    'components/x.tsx',
    'export const a = () => { const b = 1; };',
    '@typescript-eslint/no-unused-vars',
  ],
  [
    'components/x.tsx',
    "import { useState } from 'react';\nexport const A = (b: boolean) => b && useState(1);",
    'react-hooks/rules-of-hooks',
  ],
];
