import { getDocumentProxy } from 'unpdf';

export type ReadPdf = {
  /** Text of each page, white space made one blank. */
  pages: string[];
  sizes: [number, number][];
  bookmarks: string[];
  tagged: boolean;
  language: string | null;
  /** Texts with the place of their base line from the page's lower left, points. */
  texts: { page: number; text: string; x: number; y: number; width: number }[];
};

/** What a reader's program finds in a PDF. */
export async function readPdf(bytes: Buffer): Promise<ReadPdf> {
  const pdf = await getDocumentProxy(new Uint8Array(bytes), { verbosity: 0 });
  const read: ReadPdf = {
    pages: [],
    sizes: [],
    bookmarks: (await pdf.getOutline())?.map(({ title }) => title) ?? [],
    tagged: (await pdf.getMarkInfo())?.Marked === true,
    language: ((await pdf.getMetadata()).info as { Language?: string }).Language ?? null,
    texts: [],
  };
  for (let number = 1; number <= pdf.numPages; number++) {
    const page = await pdf.getPage(number);
    const [, , width = 0, height = 0] = page.view;
    read.sizes.push([width, height]);
    const words: string[] = [];
    for (const item of (await page.getTextContent()).items) {
      if (!('str' in item) || item.str.trim() === '') continue;
      words.push(item.str);
      const [, , , , x = 0, y = 0] = item.transform as number[];
      read.texts.push({ page: number, text: item.str, x, y, width: item.width });
    }
    read.pages.push(words.join(' ').replace(/\s+/g, ' '));
  }
  return read;
}
