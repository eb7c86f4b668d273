import type { StoreFailure } from '@/sync/client/projects-client';

interface FailureTexts {
  title: string;
  text: string;
  detail?: string;
}

/** What to say when the store on this device did not open. */
export function failureTexts(failure: StoreFailure | null): FailureTexts {
  switch (failure?.kind) {
    case 'open-elsewhere':
      return {
        title: 'Open in another tab',
        text: 'Your counts are safe there. Close the other tab, or try again here.',
      };
    case 'newer-schema':
      return {
        title: 'This page is an older Matside',
        text: 'Your projects were saved by a newer one. Reload to get it; nothing is lost.',
      };
    case 'storage-full':
      return {
        title: 'This device is full',
        text: 'What you counted so far is kept. Make some room, then try again.',
      };
    default:
      return {
        title: 'Your projects did not open',
        text: 'What you counted is still on this device.',
        ...(failure?.kind === 'failed' && { detail: failure.detail }),
      };
  }
}
