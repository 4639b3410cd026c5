import { readFile } from 'node:fs/promises';
import type { Download } from 'playwright-core';
import { extractText, getDocumentProxy } from 'unpdf';

/** Text of a PDF that the browser has saved, all pages together. */
export async function readPdf(download: Download): Promise<string> {
  const bytes = await readFile(await download.path());
  const { text } = await extractText(await getDocumentProxy(new Uint8Array(bytes)), { mergePages: true });
  return text;
}
