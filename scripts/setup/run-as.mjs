import { spawnSync } from 'node:child_process';

const IS_ROOT = process.getuid() === 0;

/**
 * The user that PostgreSQL's programs run as: they refuse root, so for root it is Debian's
 * `postgres` user (made when missing); for anybody else, oneself.
 * @returns spawn options: uid and gid, or nothing
 */
export function postgresUser() {
  if (!IS_ROOT) return {};
  const known = idsOf('postgres');
  if (known) return known;
  spawnSync('useradd', [
    '--system',
    '--no-create-home',
    '--shell',
    '/usr/sbin/nologin',
    'postgres',
  ]);
  const made = idsOf('postgres');
  if (!made) throw new Error('There is no user "postgres", and it could not be made.');
  return made;
}

function idsOf(name) {
  const [uid, gid] = ['-u', '-g'].map((flag) => {
    const { status, stdout } = spawnSync('id', [flag, name], { encoding: 'utf8' });
    return status === 0 ? Number(stdout) : null;
  });
  return uid === null || gid === null ? null : { uid, gid };
}

/** Whether that user can enter the folder, which may lie under one that is closed to it. */
export function canEnter(user, folder) {
  if (user.uid === undefined) return true;
  return spawnSync('test', ['-x', folder], { ...user, cwd: '/' }).status === 0;
}
