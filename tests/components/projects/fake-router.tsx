import { cloneElement, type ReactElement } from 'react';

/** Stands in for expo-router: remembers where the app went, and draws links as links. */
export const fakeRouter = {
  params: {} as Record<string, string>,
  went: [] as string[],
  reset(params: Record<string, string> = {}) {
    this.params = params;
    this.went = [];
  },
};

const go = (href: string) => void fakeRouter.went.push(href);

interface FakeLinkProps {
  href: string;
  children: ReactElement<{ href?: string; onPress?: () => void }>;
}

/** What `jest.mock('expo-router')` gives instead. */
export const fakeExpoRouter = {
  router: { push: go, replace: go, back: () => go('back') },
  useLocalSearchParams: () => fakeRouter.params,
  useIsFocused: () => true,
  Link: ({ href, children }: FakeLinkProps) => cloneElement(children, { href }),
};
