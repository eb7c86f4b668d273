import { renderRouter, screen } from 'expo-router/testing-library';
import { act, fireEvent } from '@testing-library/react-native';
import { Text } from 'react-native';

import { NotFoundScreen } from '@/components/shell/not-found-screen';
import { PlacePage } from '@/components/shell/place-page';

jest.mock('@/sync/client/projects', () => require('./fake-projects'));

const routes = {
  index: () => (
    <PlacePage place="ready" chip>
      <Text>what is ready</Text>
    </PlacePage>
  ),
  projects: () => (
    <PlacePage place="projects" title="Plan the plates" back={{ label: 'Ready', href: '/' }}>
      <Text>the plan</Text>
    </PlacePage>
  ),
  me: () => (
    <PlacePage place="me">
      <Text>settings</Text>
    </PlacePage>
  ),
  '+not-found': NotFoundScreen,
};

const press = (id: string) => act(async () => void fireEvent.press(screen.getByTestId(id)));

it('offers the places that do something, and goes there', async () => {
  const app = renderRouter(routes, { initialUrl: '/' });
  expect(screen.getAllByRole('link')).toHaveLength(3);
  await press('place-me');
  expect(app.getPathname()).toBe('/me');
  expect(screen.getByText('settings')).toBeTruthy();
});

it('names a page by its place or by its own title', () => {
  renderRouter(routes, { initialUrl: '/' });
  expect(screen.getByRole('heading', { name: 'Ready' })).toBeTruthy();
  expect(screen.getByText('Saved on this device')).toBeTruthy();
});

it('shows the way back above a title', async () => {
  const app = renderRouter(routes, { initialUrl: '/projects' });
  expect(screen.getByRole('heading', { name: 'Plan the plates' })).toBeTruthy();
  await press('back');
  expect(app.getPathname()).toBe('/');
});

it('offers Ready where an address leads nowhere', async () => {
  const app = renderRouter(routes, { initialUrl: '/nowhere' });
  expect(screen.getByText('No page at this address')).toBeTruthy();
  await act(async () => void fireEvent.press(screen.getByText('Go to Ready')));
  expect(app.getPathname()).toBe('/');
});
