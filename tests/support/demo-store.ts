import type { Page } from 'playwright-core';

import type { Answer, Command } from '../../sync/store/command';
import { newId } from '../../sync/client/new-id';

const CHANNEL = 'matside-database';
const PATIENCE_MS = 20_000;

/**
 * Asks the store as any further tab does: over the tabs' own channel, one command after the other,
 * each answered by the leading tab once it is on disk.
 *
 * @param page any page of the app's origin
 * @throws when a command is refused or not answered
 */
export async function askStore(page: Page, commands: readonly Command[]): Promise<Answer[]> {
  const requests = commands.map((command) => ({ request: newId(Date.now()), command }));
  const answers = await page.evaluate(sendAll, {
    requests,
    name: CHANNEL,
    patienceMs: PATIENCE_MS,
  });
  const refused = answers.find((answer) => !answer.ok);
  if (refused) throw new Error(`the store refused: ${JSON.stringify(refused)}`);
  return answers;
}

interface Sending {
  requests: { request: string; command: Command }[];
  name: string;
  patienceMs: number;
}

/** Runs in the page. */
async function sendAll({ requests, name, patienceMs }: Sending): Promise<Answer[]> {
  const channel = new BroadcastChannel(name);
  const ask = ({ request, command }: Sending['requests'][number]) =>
    new Promise<Answer>((resolve, reject) => {
      const late = setTimeout(() => reject(new Error('no tab leads')), patienceMs);
      channel.onmessage = ({ data }: MessageEvent) => {
        if (data.kind !== 'answer' || data.request !== request) return;
        clearTimeout(late);
        resolve(data.answer);
      };
      const untilMs = Date.now() + patienceMs;
      channel.postMessage({ kind: 'request', request, command, untilMs });
    });
  const answers: Answer[] = [];
  for (const each of requests) answers.push(await ask(each));
  channel.close();
  return answers;
}
