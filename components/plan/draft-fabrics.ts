import type { DraftFabric, SetupDraft } from '@/components/plan/draft';
import { pickNextCloth } from '@/components/plan/fabric-palette';
import type { RequestFabric } from '@/shared/model/plan-request';

const letterAt = (place: number) => String.fromCharCode('A'.charCodeAt(0) + place);

/** All fabrics in the order of their letters: wedges first, the background, the circle's own. */
export function listFabrics(draft: SetupDraft): DraftFabric[] {
  const own = draft.centre === 'circle' && draft.circleCloth ? [draft.circleCloth] : [];
  return [...draft.wedgeFabrics, draft.background, ...own];
}

/** The fabrics as a request has them, lettered from A. */
export function letterFabrics(draft: SetupDraft): RequestFabric[] {
  return listFabrics(draft).map(({ id, name, colour, oneWay, dominant, buyYards }, place) => {
    const wedge = place < draft.wedgeFabrics.length;
    return {
      letter: letterAt(place),
      name: name.trim(),
      role: wedge ? 'wedge' : id === draft.background.id ? 'background' : 'circle',
      colour,
      oneWay,
      dominant: wedge && dominant,
      ...(buyYards !== undefined && { buyYards }),
    };
  });
}

/** The letter of the fabric that the maker chose for the circle, when it is still there. */
export function findCircleLetter(draft: SetupDraft): string | null {
  if (draft.circleFabric === null) return null;
  const place = listFabrics(draft).findIndex(({ id }) => id === draft.circleFabric);
  return place < 0 ? null : letterAt(place);
}

function freshId(draft: SetupDraft): string {
  const numbers = draft.wedgeFabrics.map(({ id }) => Number(id.replace(/^\D+/, '')) || 0);
  return `f${Math.max(0, ...numbers) + 1}`;
}

export function addFabric(draft: SetupDraft): SetupDraft {
  const cloth = pickNextCloth(listFabrics(draft));
  const added = { ...cloth, id: freshId(draft), oneWay: false, dominant: false };
  return { ...draft, wedgeFabrics: [...draft.wedgeFabrics, added] };
}

export function removeFabric(draft: SetupDraft, id: string): SetupDraft {
  return { ...draft, wedgeFabrics: draft.wedgeFabrics.filter((fabric) => fabric.id !== id) };
}

/** Puts a removed fabric back where it was. */
export function putFabricBack(draft: SetupDraft, fabric: DraftFabric, place: number): SetupDraft {
  const starred = draft.wedgeFabrics.some(({ dominant }) => dominant);
  const back = { ...fabric, dominant: fabric.dominant && !starred };
  return { ...draft, wedgeFabrics: draft.wedgeFabrics.toSpliced(place, 0, back) };
}

/** Moves a wedge fabric one place up (−1) or down (1); at the end of the list nothing moves. */
export function moveFabric(draft: SetupDraft, id: string, by: 1 | -1): SetupDraft {
  const from = draft.wedgeFabrics.findIndex((fabric) => fabric.id === id);
  const moved = draft.wedgeFabrics[from];
  const to = from + by;
  if (!moved || to < 0 || to >= draft.wedgeFabrics.length) return draft;
  return { ...draft, wedgeFabrics: draft.wedgeFabrics.toSpliced(from, 1).toSpliced(to, 0, moved) };
}

/** Changes one fabric, whatever it is for; a star given to one is taken from the others. */
export function changeFabric(
  draft: SetupDraft,
  id: string,
  patch: Partial<Omit<DraftFabric, 'id'>>,
): SetupDraft {
  const change = (fabric: DraftFabric): DraftFabric => {
    if (fabric.id === id) return { ...fabric, ...patch };
    return patch.dominant ? { ...fabric, dominant: false } : fabric;
  };
  return {
    ...draft,
    wedgeFabrics: draft.wedgeFabrics.map(change),
    background: change(draft.background),
    circleCloth: draft.circleCloth && change(draft.circleCloth),
  };
}

/** Sets what is bought of the fabric with this letter; null goes back to what is needed. */
export function buyFabric(draft: SetupDraft, letter: string, yards: string | null): SetupDraft {
  const fabric = listFabrics(draft)[letter.charCodeAt(0) - 'A'.charCodeAt(0)];
  if (!fabric) return draft;
  const { buyYards: _, ...plain } = fabric;
  const bought = yards === null ? plain : { ...plain, buyYards: yards };
  const change = (one: DraftFabric) => (one.id === fabric.id ? bought : one);
  return {
    ...draft,
    wedgeFabrics: draft.wedgeFabrics.map(change),
    background: change(draft.background),
    circleCloth: draft.circleCloth && change(draft.circleCloth),
  };
}

/** Gives the circle a cloth of its own, or one of the fabrics there are. */
export function chooseCircleFabric(draft: SetupDraft, id: string | 'own' | null): SetupDraft {
  if (id !== 'own') {
    const own = id !== null && id === draft.circleCloth?.id ? draft.circleCloth : null;
    return { ...draft, circleFabric: id, circleCloth: own };
  }
  const cloth = pickNextCloth(listFabrics(draft));
  const own = { ...cloth, id: 'circle', oneWay: false, dominant: false };
  return { ...draft, circleFabric: own.id, circleCloth: own };
}
