import type { Right } from './entities/scope-right';
import type { Role } from './entities/app-user';
import type { ScopeKind } from './entities/sync-scope';

export interface DemoPerson {
  id: string;
  displayName: string;
  role: Role;
  email: string;
}

export interface DemoScope {
  id: string;
  kind: ScopeKind;
  owner: DemoPerson;
  shared: readonly { with: DemoPerson; right: Right }[];
}

/** The nth fixed id of a series: a well-formed UUIDv7, so that seeding twice is seeding once. */
function fixedId(series: 'person' | 'own' | 'class' | 'project', n: number): string {
  const letter = { person: 'a', own: 'b', class: 'c', project: 'd' }[series];
  return `019de000-0000-7000-8000-${letter}${String(n).padStart(11, '0')}`;
}

function person(n: number, displayName: string, role: Role = 'member'): DemoPerson {
  const local = displayName.toLowerCase().replaceAll(' ', '.');
  return { id: fixedId('person', n), displayName, role, email: `${local}@example.org` };
}

// The quilting guild of a small harbour town sews a raffle quilt for its lifeboat station.
const maker = person(1, 'Wilmot Ferrand');
const helper = person(2, 'Jessa Tollan');
const teacher = person(3, 'Orla Pennick', 'teacher');
const shop = person(4, 'Ropewalk Cloth');
const classOfEight = [
  'Bettany Crake',
  'Dov Hallin',
  'Elspet Marrow',
  'Fenna Quill',
  'Gwil Tarrant',
  'Hester Voe',
  'Ines Lodder',
  'Kit Sandover',
].map((name, index) => person(11 + index, name));

export const DEMO_PEOPLE: readonly DemoPerson[] = [maker, helper, teacher, shop, ...classOfEight];

const ownScopes = DEMO_PEOPLE.map((owner, index): DemoScope => {
  return { id: fixedId('own', index + 1), kind: 'own', owner, shared: [] };
});

export const DEMO_SCOPES: readonly DemoScope[] = [
  ...ownScopes,
  {
    id: fixedId('class', 1),
    kind: 'class',
    owner: teacher,
    shared: classOfEight.map((pupil) => ({ with: pupil, right: 'read' })),
  },
  {
    id: fixedId('project', 1), // Harbour Lights, the raffle quilt: cut together, cloth from the shop
    kind: 'project',
    owner: maker,
    shared: [
      { with: helper, right: 'write' },
      { with: shop, right: 'read' },
    ],
  },
  { id: fixedId('project', 2), kind: 'project', owner: maker, shared: [] }, // Shed Window
  { id: fixedId('project', 3), kind: 'project', owner: maker, shared: [] }, // Pier Runner
];
