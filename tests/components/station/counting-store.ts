import { exampleProjects } from '@/shared/plan/example-projects';
import { makePlan } from '@/shared/plan/make-plan';
import { createLocalClient } from '@/sync/client/local-client';
import type { ProjectsClient } from '@/sync/client/projects-client';

import { openNodeDatabase } from '../../support/open-node-database';

let made = 0;
let nowMs = 1_800_000_000_000;
const random16 = async () => new Uint8Array(16).map((_, at) => (at === 15 ? made : at));

/**
 * The store itself over SQLite in memory, so that a page is tested on what a device really does.
 *
 * @public taken by jest.mock
 */
export const projects: ProjectsClient = createLocalClient({
  open: async () => openNodeDatabase(':memory:'),
  tools: {
    nowMs: () => (nowMs += 1),
    random16: async () => {
      made += 1;
      return random16();
    },
    newIds: async (count) =>
      Array.from({ length: count }, () => {
        made += 1;
        return `01900000-0000-7000-8000-${String(made).padStart(12, '0')}`;
      }),
    makePlan,
    exampleProjects,
  },
});
