import { chmodSync, existsSync, writeFileSync } from 'node:fs';
import path from 'node:path';

import { bring, UNPACKED, unpackedEnv } from './debian.mjs';
import { run } from './run.mjs';

const SYSTEM = process.env.CHROMIUM ?? '/usr/bin/chromium';

/** The path of Chromium for the browser tests: the system's, or brought from Debian. */
export function bringChromium() {
  return bring({ name: 'chromium', look, choose });
}

function look() {
  if (existsSync(SYSTEM)) return SYSTEM;
  const program = path.join(UNPACKED, 'usr/lib/chromium/chromium');
  return existsSync(program) ? launcherFor(program) : null;
}

/** A short script, so that only Chromium gets the unpacked libraries, not Node. */
function launcherFor(program) {
  const launcher = path.join(UNPACKED, 'chromium');
  const env = { ...unpackedEnv(), FONTCONFIG_FILE: writeFontsConfig() };
  const words = Object.entries(env).map(([name, value]) => `${name}='${value}'`);
  writeFileSync(launcher, `#!/bin/sh\n${words.join(' ')} exec '${program}' "$@"\n`);
  chmodSync(launcher, 0o755);
  return launcher;
}

/** Debian's own names /usr/share/fonts only, where the unpacked fonts are not. */
function writeFontsConfig() {
  const file = path.join(UNPACKED, 'fonts.conf');
  const folders = ['/usr/share/fonts', path.join(UNPACKED, 'usr/share/fonts')];
  const cache = `<cachedir>${path.join(UNPACKED, 'fonts-cache')}</cachedir>`;
  const lines = [...folders.map((it) => `<dir>${it}</dir>`), cache];
  writeFileSync(file, `<fontconfig>\n${lines.join('\n')}\n</fontconfig>\n`);
  return file;
}

async function choose(aptOptions) {
  const { text } = await run('apt-cache', [...aptOptions, 'policy', 'chromium'], { mayFail: true });
  return /Candidate: \d/.test(text) ? 'chromium' : null;
}
