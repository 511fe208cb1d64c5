import type { ReadFile } from './readProjectFile.ts';

/** The demo project, which lies beside the page. */
export async function loadDemo(): Promise<ReadFile & { readonly fileName: string }> {
  const fileName = 'approach-embankment.json';
  const unread = {
    ok: false,
    fileName,
    right: 'the demo beside the page; open a file of your own instead',
  } as const;
  try {
    const answer = await fetch(new URL(`demo/${fileName}`, document.baseURI));
    return answer.ok ? { ok: true, fileName, text: await answer.text() } : unread;
  } catch {
    return unread;
  }
}
