import { fakeExpoRouter, fakeRouter } from '../projects/fake-router';

const went = (href: unknown) =>
  void fakeRouter.went.push(typeof href === 'string' ? href : JSON.stringify(href));

/**
 * expo-router for a station page: it also goes by parts and sets its step.
 *
 * @public taken by jest.mock
 */
export const stationRouter = {
  ...fakeExpoRouter,
  router: {
    push: went,
    replace: went,
    back: () => went('back'),
    canGoBack: () => true,
    setParams: (params: unknown) => went(params),
  },
};
