import { newId } from '../../../sync/client/new-id';

it('makes UUIDv7s that sort by their time', () => {
  const ids = [3, 1, 2].map((second) => newId(second * 1000));
  expect(ids.every((id) => /^[0-9a-f]{8}-[0-9a-f]{4}-7[0-9a-f]{3}-[89ab]/.test(id))).toBe(true);
  expect([...ids].sort()).toEqual([ids[1], ids[2], ids[0]]);
});

it('takes the randomness it is given', () => {
  const random = Uint8Array.from({ length: 16 }, (_, index) => index);
  expect(newId(1000, random)).toBe(newId(1000, random));
  expect(newId(1000)).not.toBe(newId(1000));
});
