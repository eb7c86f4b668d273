import { failureOf } from '../../../sync/client/failure-of';
import { NewerSchemaError } from '../../../sync/store/migrate';

const room = async () => false;
const noRoom = async () => true;

it.each([
  ['Error code 13: database or disk is full', { kind: 'storage-full' }],
  ['QuotaExceededError', { kind: 'storage-full' }],
])('tells from %s that the storage is full', async (text, failure) => {
  expect(await failureOf(new Error(text), room)).toEqual(failure);
});

it('takes an I/O error for full storage only when the browser says so too', async () => {
  const error = new Error('Error code 10: disk I/O error');
  expect(await failureOf(error, noRoom)).toEqual({ kind: 'storage-full' });
  expect(await failureOf(error, room)).toEqual({
    kind: 'failed',
    detail: 'Error code 10: disk I/O error',
  });
});

it('tells of a newer schema', async () => {
  expect(await failureOf(new NewerSchemaError('schema 9'), room)).toEqual({ kind: 'newer-schema' });
});
