import { startDraft } from '@/components/plan/draft';
import { addFabric, buyFabric, letterFabrics } from '@/components/plan/draft-fabrics';
import { draftFromRequest } from '@/components/plan/draft-from-request';
import { readSize, stepSize } from '@/components/plan/field-texts';
import { readDraft } from '@/components/plan/read-draft';
import { parseDraft } from '@/components/plan/use-kept-draft';

import { fabricsFor, ringRequest } from '../projects/fake-projects-client';

const HABITS = { bladeMm: 45, cap: null } as const;

describe('readSize', () => {
  it('reads lengths, whole numbers and per cent', () => {
    expect(readSize('block', '12 1/2 in')).toEqual({ ok: true, value: '25/2' });
    expect(readSize('wedges', ' 20 ')).toEqual({ ok: true, value: '20' });
    expect(readSize('shrinkPercent', '3 %')).toEqual({ ok: true, value: '3' });
    expect(readSize('shrinkPercent', '0')).toEqual({ ok: true, value: '0' });
  });

  it.each([
    ['block', 'wide', 'not-a-length'],
    ['block', '-1', 'not-positive'],
    ['blocks', '2 1/2', 'not-a-count'],
    ['blocks', '0', 'not-positive'],
    ['blocks', '-2', 'not-positive'],
    ['shrinkPercent', 'some', 'not-a-percentage'],
    ['shrinkPercent', '-3', 'not-positive'],
  ] as const)('refuses %s %s as %s', (field, typed, kind) => {
    expect(readSize(field, typed)).toEqual({ ok: false, kind });
  });
});

describe('stepSize', () => {
  it('steps by what a maker would', () => {
    expect(stepSize('block', '12', 1)).toBe('13');
    expect(stepSize('stripHeight', '4', 1)).toBe('4¼');
    expect(stepSize('narrowAt', '1½', -1)).toBe('1⅜');
    expect(stepSize('shrinkPercent', '1', -1)).toBe('0');
  });

  it('does not step to nothing, nor from what it cannot read', () => {
    expect(stepSize('blocks', '1', -1)).toBeNull();
    expect(stepSize('stripHeight', '1/4', -1)).toBeNull();
    expect(stepSize('shrinkPercent', '0', -1)).toBeNull();
    expect(stepSize('block', 'twelve', 1)).toBeNull();
  });
});

describe('readDraft', () => {
  it('plans the form as it starts', () => {
    const read = readDraft(startDraft(), HABITS);
    expect(read.ok && read.value.request).toMatchObject({
      block: '16',
      narrowAt: '2',
      stripHeight: '11/2',
      centre: { fabric: 'A' },
      background: { fabric: 'E' },
      cutting: { bladeMm: 45, cap: 4 },
    });
  });

  it('keeps the maker’s own cap to her own blade', () => {
    const habits = { bladeMm: 45, cap: 7 } as const;
    const own = readDraft(startDraft(), habits);
    const other = readDraft({ ...startDraft(), bladeMm: 60 }, habits);
    expect(own.ok && own.value.request.cutting.cap).toBe(7);
    expect(other.ok && other.value.request.cutting.cap).toBe(6);
  });

  it('tells of every field that is wrong by itself, unreadable ones among them', () => {
    const texts = { block: 'big', blocks: '0', wedges: '4', usableWidth: '42' };
    const read = readDraft({ ...startDraft(), texts }, HABITS);
    expect(!read.ok && read.errors).toEqual({
      block: 'Not a length. Write 4 1/4, 4¼ or 4.25.',
      blocks: 'Nothing would be left. Use more than 0.',
      wedges: 'Too few. Use 5 or more.',
    });
  });

  it('refuses a thirteenth wedge fabric', () => {
    const many = Array.from({ length: 9 }).reduce<ReturnType<typeof startDraft>>(
      (draft) => addFabric(draft),
      startDraft(),
    );
    const read = readDraft(many, HABITS);
    expect(!read.ok && read.errors.fabrics).toBe('Too many fabrics. Use 12 or fewer.');
  });
});

describe('fabrics of a draft', () => {
  it('get a new cloth each, by name and by colour', () => {
    const many = Array.from({ length: 8 }).reduce<ReturnType<typeof startDraft>>(
      (draft) => addFabric(draft),
      startDraft(),
    );
    const fabrics = letterFabrics(many);
    expect(new Set(fabrics.map(({ name }) => name)).size).toBe(13);
    expect(new Set(fabrics.map(({ colour }) => colour)).size).toBe(13);
    expect(fabrics.at(-1)).toMatchObject({ letter: 'M', name: 'Fog', role: 'background' });
  });

  it('keep what is bought by their letter', () => {
    const bought = buyFabric(startDraft(), 'E', '5/8');
    expect(letterFabrics(bought)[4]?.buyYards).toBe('5/8');
    expect(letterFabrics(buyFabric(bought, 'E', null))[4]).not.toHaveProperty('buyYards');
    expect(buyFabric(bought, 'Z', '1')).toBe(bought);
  });
});

describe('draftFromRequest', () => {
  it.each([
    ['a pointed ring', {}],
    ['a flat ring with an open hole', { tip: 'flat', centre: 'none', holeTurnUnder: '3/8' }],
    ['own sizes', { stripHeight: '7/2', narrowAt: '5/4', layers: 3, cap: 5, shrinkPercent: '3' }],
    ['turnings of its own', { tipTurning: '3/8', circleTurning: '3/8', circleEdge: 'fused' }],
    [
      'a cloth for the circle alone',
      {
        circleFabric: 'G',
        fabrics: [
          ...fabricsFor(5, 'B'),
          {
            letter: 'G',
            name: 'Moon',
            role: 'circle',
            colour: '#8A6A94',
            oneWay: false,
            dominant: false,
          },
        ],
      },
    ],
  ] as const)('plans the same for %s', (_, choices) => {
    const request = ringRequest(choices as Partial<Parameters<typeof ringRequest>[0]>);
    const draft = draftFromRequest('Copy', request, HABITS);
    const read = draft && readDraft(draft, HABITS);
    expect(read?.ok && read.value.request).toEqual(request);
  });
});

describe('parseDraft', () => {
  it('takes back what it kept, and nothing else', () => {
    const draft = startDraft();
    expect(parseDraft(JSON.stringify(draft))).toEqual(draft);
    expect(parseDraft('{"version":0}')).toBeNull();
    expect(parseDraft('{')).toBeNull();
    expect(parseDraft(null)).toBeNull();
  });
});
