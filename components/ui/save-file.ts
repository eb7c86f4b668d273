import { Platform, Share } from 'react-native';

/** Long enough for the browser to start reading what it saves. */
const KEPT_MS = 60_000;

/** Gives a text to the maker as a file: a download in a browser, the share sheet on a device. */
export async function saveFile(name: string, text: string, mime: string): Promise<void> {
  if (Platform.OS !== 'web') {
    await Share.share({ title: name, message: text });
    return;
  }
  const url = URL.createObjectURL(new Blob([text], { type: mime }));
  const link = document.createElement('a');
  link.href = url;
  link.download = name;
  document.body.append(link);
  link.click();
  link.remove();
  setTimeout(() => URL.revokeObjectURL(url), KEPT_MS);
}
