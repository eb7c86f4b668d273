import { InvariantError } from '../../../shared/result';
import { DONE, type Answer } from '../command';
import { sql } from '../sql-text';
import type { StoreTools } from '../store-tools';
import type { Work } from '../work';
import { createProject } from './create-project';
import { setTally } from './set-tally';

/**
 * Opens the example's projects, each with its counts; nothing when they are open already. The
 * first of the list comes out as the newest work.
 */
export async function openExample(work: Work, tools: StoreTools): Promise<Answer> {
  if ([...work.records.values()].some(({ view, deleted }) => view.example && !deleted)) return DONE;
  const projects = tools.exampleProjects();
  const ids = await tools.newIds(projects.length);
  const pairs = projects.map((project, index) => ({ project, id: ids[index] }));
  for (const { project, id } of pairs.reverse()) {
    if (id === undefined) throw new InvariantError('an id for each project of the example');
    const plan = tools.makePlan(project.request);
    if (!plan.ok) throw new InvariantError(`the example cannot be planned: ${project.name}`);
    const { name, note = '' } = project;
    createProject(work, { id, name, note, example: true, plan: plan.value });
    for (const { want, ...key } of project.counts) {
      const record = work.records.get(id);
      if (record) setTally(work, record, key, want);
    }
  }
  return DONE;
}

const BY_SCOPE = [
  'outbox',
  'tap',
  'tap_set',
  'tap_undo',
  'lane',
  'step',
  'field_write',
  'bin',
  'project',
  'tally_key',
];

/** Takes the example's projects away for good, what was counted on them too. */
export function removeExample(work: Work): Answer {
  const examples = [...work.records.values()].filter(({ view }) => view.example);
  for (const { view, deleted } of examples) {
    work.statements.push(
      sql`DELETE FROM view_tally WHERE tally_no IN
        (SELECT no FROM tally_key WHERE scope_id = ${view.id})`,
      ...BY_SCOPE.map((table) => `DELETE FROM ${table}` + sql` WHERE scope_id = ${view.id}`),
      sql`DELETE FROM sync_scope WHERE id = ${view.id}`,
    );
    work.records.delete(view.id);
    if (!deleted) work.changes.push({ kind: 'gone', id: view.id });
  }
  return DONE;
}
