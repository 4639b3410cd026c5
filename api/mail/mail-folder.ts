import { mkdir, readdir, readFile, rename, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { mailView, type MailView } from '#core/contract/people.ts';

/** Messages that the local mail sink has caught, one JSON file each. */
export type MailFolder = {
  add: (mail: MailView) => Promise<void>;
  /** Newest first, at most 200; a file that cannot be read is left out. */
  list: () => Promise<MailView[]>;
};

export function mailFolder(folder: string): MailFolder {
  return {
    add: async (mail) => {
      await mkdir(folder, { recursive: true, mode: 0o700 });
      // The time first, so that names sort by it; written aside and moved, so that no reader sees half a message.
      const name = `${mail.receivedAt.replace(/\W/g, '')}-${mail.id.replace(/[^\w-]/g, '')}.json`;
      const aside = join(folder, `.${name}`);
      await writeFile(aside, JSON.stringify(mail), { mode: 0o600 });
      await rename(aside, join(folder, name));
    },
    list: async () => {
      const names = (await namesIn(folder)).filter((name) => /^\w[\w-]*\.json$/.test(name));
      const newest = names.sort().reverse().slice(0, 200);
      const mails = await Promise.all(newest.map((name) => readMail(join(folder, name))));
      return mails.filter((mail) => mail !== null);
    },
  };
}

async function namesIn(folder: string): Promise<string[]> {
  try {
    return await readdir(folder);
  } catch (error) {
    if (error instanceof Error && 'code' in error && error.code === 'ENOENT') return [];
    throw error;
  }
}

async function readMail(file: string): Promise<MailView | null> {
  try {
    const parsed = mailView.safeParse(JSON.parse(await readFile(file, 'utf8')));
    return parsed.success ? parsed.data : null;
  } catch {
    return null;
  }
}
