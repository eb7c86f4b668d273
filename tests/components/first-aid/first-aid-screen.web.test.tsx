import { FirstAidScreen } from '@/components/first-aid/first-aid-screen';

import { fakeRouter } from '../projects/fake-router';
import { byId, openPage, text } from '../projects/page';
import { click } from '../ui/mount-web';

jest.mock('expo-router', () => require('../station/station-router').stationRouter);
jest.mock('@/sync/client/projects', () => {
  const { FakeProjectsClient: Fake } = require('../projects/fake-projects-client');
  return { projects: new Fake() };
});

it('says what to do first, when to call and when to get help, and goes back', async () => {
  fakeRouter.reset();
  const page = await openPage(<FirstAidScreen />);
  expect(text()).toContain('press firmly with a clean pad for 10 minutes');
  expect(text()).toContain('Raise the hand above the heart.');
  expect(text()).toContain('leave the first pad on and add another');
  expect(text()).toContain('Press on either side of it.');
  expect(text()).toContain('Call the local emergency number');
  expect(text()).toContain('a finger does not bend or straighten');
  await click(byId('back'));
  expect(fakeRouter.went).toEqual(['back']);
  await page.unmount();
});
