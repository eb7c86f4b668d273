import { router } from 'expo-router';

import { useExample } from '@/components/projects/use-example';
import { EmptyState } from '@/components/ui/empty-state';

interface NothingYetProps {
  title: string;
  text: string;
}

/** No project on this device: plan one, or look at the example. */
export function NothingYet({ title, text }: NothingYetProps) {
  const { open } = useExample();
  return (
    <EmptyState
      title={title}
      text={text}
      actions={[
        {
          label: 'Plan a quilt',
          icon: 'plus',
          onPress: () => router.push('/projects/new'),
          testID: 'plan-a-quilt',
        },
        {
          label: 'Open the example',
          icon: 'projects',
          onPress: () => void open(),
          testID: 'open-example',
        },
      ]}
    />
  );
}
