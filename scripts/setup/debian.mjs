import { existsSync, mkdirSync, readdirSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';

import { CACHE } from './paths.mjs';
import { run } from './run.mjs';
import { say, SetupError } from './say.mjs';

/** Where packages are unpacked to for somebody who may not install them. */
export const UNPACKED = path.join(CACHE, 'debian');
const QUIET = { env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive', LC_ALL: 'C' } };
const INSTALL = ['install', '-y', '--no-install-recommends', '-o', 'DPkg::Lock::Timeout=300'];

/**
 * Brings programs from Debian when they are missing: root installs them, a user with sudo that
 * asks for no password too; anybody else gets them unpacked into the project's folder.
 *
 * @param what { name, look, choose }: what people call it, a function that finds it or returns
 *   `null`, and one that picks the package's name by asking `apt`
 * @returns what `look` found
 */
export async function bring({ name, look, choose }) {
  const there = look();
  if (there) return there;
  if (!(await works('apt-get', ['--version']))) throw new SetupError(advice(name, name));
  let wanted = name;
  try {
    const before = await rights();
    if (before) wanted = await install(name, choose, before);
    else wanted = await unpack(name, choose);
  } catch (error) {
    throw new SetupError(`${advice(name, wanted)}\n\n${error.message}`);
  }
  const found = look();
  if (!found) throw new SetupError(advice(name, wanted));
  return found;
}

function advice(name, wanted) {
  return `${name} is missing and could not be installed from here. Please run
  sudo apt-get update && sudo apt-get install -y --no-install-recommends ${wanted}
and then this command again.`;
}

/** @returns what stands before apt-get's name, or `null` without the right to install */
async function rights() {
  if (process.getuid() === 0) return [];
  return (await works('sudo', ['-n', 'apt-get', '--version'])) ? ['sudo', '-n', '-E'] : null;
}

async function works(command, args) {
  return (await run(command, args, { mayFail: true })).code === 0;
}

async function install(name, choose, before) {
  say(`Installing ${name} from Debian (up to a minute) …`);
  const apt = (...args) => {
    const [command, ...rest] = [...before, 'apt-get', ...args];
    return run(command, rest, { ...QUIET, finish: true }); // never leave dpkg half done
  };
  let wanted = await choose([]);
  if (!wanted) {
    await apt('update');
    wanted = await choose([]);
  }
  if (!wanted) throw new SetupError(`Debian's package lists do not know ${name}.`);
  const restore = await noSystemCluster(before);
  try {
    await apt(...INSTALL, wanted).catch(async () => {
      await apt('update'); // the lists may name files that are gone
      await apt(...INSTALL, wanted);
    });
  } finally {
    await restore();
  }
  return wanted;
}

/** Debian would make and start a cluster of its own: Matside wants the programs only. */
async function noSystemCluster(before) {
  const folder = '/etc/postgresql-common/createcluster.d';
  const file = `${folder}/matside.conf`;
  const shell = (script) => {
    const [command, ...rest] = [...before, 'sh', '-c', script];
    return run(command, rest, { finish: true });
  };
  await shell(`mkdir -p ${folder} && echo 'create_main_cluster = false' > ${file}`);
  return () => shell(`rm -f ${file}; rmdir --ignore-fail-on-non-empty -p ${folder} || true`);
}

/** The package and what it needs that is not installed, downloaded and unpacked; no rights used. */
async function unpack(name, choose) {
  say(`Unpacking ${name} from Debian into .cache/debian (no right to install; a minute) …`);
  const work = path.join(CACHE, 'apt');
  const options = ownState(work);
  await run('apt-get', [...options, 'update'], QUIET);
  const wanted = await choose(options);
  if (!wanted) throw new SetupError(`Debian's package lists do not know ${name}.`);
  const plan = [...options, '-s', '--no-install-recommends', 'install', wanted];
  const { text } = await run('apt-get', plan, QUIET);
  const needed = [...text.matchAll(/^Inst (\S+)(?: \[[^\]]*\])? \((\S+)/gm)];
  const debs = path.join(work, 'debs');
  rmSync(debs, { recursive: true, force: true });
  mkdirSync(debs, { recursive: true });
  const names = needed.map(([, pkg, version]) => `${pkg}=${version}`);
  await run('apt-get', [...options, 'download', ...names], { ...QUIET, cwd: debs });
  const partial = `${UNPACKED}.partial`;
  rmSync(partial, { recursive: true, force: true });
  if (existsSync(UNPACKED)) await run('cp', ['-a', UNPACKED, partial]);
  for (const deb of readdirSync(debs)) await run('dpkg', ['-x', path.join(debs, deb), partial]);
  rmSync(UNPACKED, { recursive: true, force: true });
  renameSync(partial, UNPACKED);
  rmSync(debs, { recursive: true, force: true });
  return wanted;
}

/** Lists and a cache of our own: the system's belong to root. */
function ownState(work) {
  for (const folder of ['state/lists/partial', 'cache/archives/partial']) {
    mkdirSync(path.join(work, folder), { recursive: true });
  }
  writeFileSync(path.join(work, 'empty'), '');
  const settings = {
    'Dir::State': path.join(work, 'state'),
    'Dir::State::status': '/var/lib/dpkg/status',
    'Dir::Cache': path.join(work, 'cache'),
    'Debug::NoLocking': '1',
    'APT::Sandbox::User': '',
  };
  return Object.entries(settings).flatMap(([key, value]) => ['-o', `${key}=${value}`]);
}

/** The environment for programs in UNPACKED: their libraries lie there too, some a level down. */
export function unpackedEnv() {
  const own = ['usr/lib', 'lib'].flatMap((lib) => {
    const machines = foldersIn(path.join(UNPACKED, lib)).filter((it) => it.includes('-linux-gnu'));
    return machines.flatMap((machine) => [machine, ...foldersIn(machine).filter(holdsLibraries)]);
  });
  const before = process.env.LD_LIBRARY_PATH;
  return { LD_LIBRARY_PATH: [...own, ...(before ? [before] : [])].join(':') };
}

function foldersIn(folder) {
  if (!existsSync(folder)) return [];
  return readdirSync(folder, { withFileTypes: true })
    .filter((entry) => entry.isDirectory())
    .map((entry) => path.join(folder, entry.name));
}

function holdsLibraries(folder) {
  return readdirSync(folder).some((name) => /^lib.*\.so/.test(name));
}
