import { exampleProjects } from '../../shared/plan/example-projects';
import { makePlan } from '../../shared/plan/make-plan';
import type { ProjectsClient } from './projects-client';
import { browserEnvironment } from './tabs/browser-environment';
import { createTabClient } from './tabs/create-tab-client';

export const projects: ProjectsClient = createTabClient(
  browserEnvironment({ makePlan, exampleProjects }),
);
