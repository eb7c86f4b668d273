import { type Href, Link } from 'expo-router';
import { Pressable, StyleSheet } from 'react-native';

import { size } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';

/** An underlined word that opens another page. */
export function LinkText({ href, children }: { href: Href; children: string }) {
  return (
    <Link href={href} asChild>
      <Pressable role="link" style={styles.link}>
        <Txt style={styles.word}>{children}</Txt>
      </Pressable>
    </Link>
  );
}

const styles = StyleSheet.create({
  link: { minHeight: size.touchMin, justifyContent: 'center', alignSelf: 'flex-start' },
  word: { textDecorationLine: 'underline' },
});
