import { projects } from '@/sync/client/projects';

import type { FakeProjectsClient } from '../projects/fake-projects-client';
import { byId, leaveField, named, seek, text, typeInto } from '../projects/page';
import { click, press } from '../ui/mount-web';
import { close, errorOf, fill, forgetDrafts, open, totals, valueOf } from './setup-page';

jest.mock('expo-router', () => require('../projects/fake-router').fakeExpoRouter);
jest.mock('@/sync/client/projects', () => {
  const { FakeProjectsClient: Fake } = require('../projects/fake-projects-client');
  return { projects: new Fake() };
});
const store = projects as unknown as FakeProjectsClient;

beforeEach(async () => {
  store.reset();
  await forgetDrafts();
});
afterEach(close);

describe('what is typed', () => {
  it.each(['4 1/4', '4¼', '4.25'])('takes %s for a length', async (typed) => {
    await open();
    await click(byId('more'));
    await fill('stripHeight', typed);
    expect(text()).toContain('Cut strip height4¼ in');
    expect(valueOf('stripHeight')).toBe(typed);
  });

  it.each([
    ['abc', 'Not a length. Write 4 1/4, 4¼ or 4.25.'],
    ['0', 'Nothing would be left. Use more than 0.'],
    ['-3', 'Nothing would be left. Use more than 0.'],
    ['3', 'Too small. Use 4 in or more.'],
    ['61', 'Too large. Use 60 in or less.'],
  ])('refuses %s as a block size and says why', async (typed, why) => {
    await open();
    await fill('block', typed);
    expect(errorOf('block')).toBe(why);
    expect(valueOf('block')).toBe(typed);
  });

  it('refuses a part of a wedge', async () => {
    await open();
    await fill('wedges', '7.5');
    expect(text()).toContain('Not a whole number. Write 5 or 20.');
  });

  it('refuses a ring that cannot be sewn, beside the size that would mend it', async () => {
    await open();
    await click(byId('more'));
    await fill('stripHeight', '1');
    expect(errorOf('stripHeight')).toMatch(
      /^The circle would cover the tips\. Use .* in or more\.$/,
    );
  });

  it('is checked when the field is left, and live once it was wrong', async () => {
    await open();
    await typeInto('block', '1');
    expect(text()).not.toContain('Too small');
    await leaveField('block');
    expect(text()).toContain('Too small');
    await typeInto('block', '12');
    expect(text()).not.toContain('Too small');
    await typeInto('block', '2');
    expect(text()).toContain('Too small');
  });

  it('keeps the last good result, dimmed, until it is right again', async () => {
    await open();
    const good = totals();
    await fill('block', 'twelve');
    expect(totals()).toBe(good);
    expect(byId('last-good').textContent).toContain('This is the last plan that worked.');
    expect(getComputedStyle(byId('figures')).opacity).toBe('0.86');
    expect(getComputedStyle(byId('drawing')).opacity).toBe('0.5');
    await fill('block', '12');
    expect(seek('last-good')).toBeNull();
    expect(totals()).not.toBe(good);
  });

  it('steps with the buttons and with the arrow keys', async () => {
    await open();
    await click(named('More, Blocks'));
    expect(valueOf('blocks')).toBe('2');
    await press(byId('wedges'), 'ArrowDown');
    expect(valueOf('wedges')).toBe('15');
  });
});

describe('defaults', () => {
  it('follow the block until the maker types her own', async () => {
    await open();
    await click(byId('more'));
    expect([valueOf('narrowAt'), valueOf('stripHeight')]).toEqual(['2', '5½']);
    await fill('block', '12');
    expect([valueOf('narrowAt'), valueOf('stripHeight')]).toEqual(['1½', '4']);
    await fill('stripHeight', '3 1/2');
    await fill('block', '14');
    expect([valueOf('narrowAt'), valueOf('stripHeight')]).toEqual(['1¾', '3 1/2']);
    await click(named('Back to the default, Strip height'));
    expect(valueOf('stripHeight')).toBe('4¾');
  });

  it('take the cap of the blade chosen', async () => {
    await open();
    expect(valueOf('cap')).toBe('4');
    await click(named('60 mm'));
    expect(valueOf('cap')).toBe('6');
  });

  it('leave the layers of a stack to the plan, and step from what it came to', async () => {
    await open();
    expect(valueOf('layers')).toBe('');
    await click(named('Less, Layers a stack'));
    expect(valueOf('layers')).toBe('3');
    await click(named('Back to the default, Layers a stack'));
    expect(valueOf('layers')).toBe('');
  });
});
