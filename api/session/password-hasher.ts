import bcrypt from 'bcryptjs';

export type PasswordHasher = {
  hash: (password: string) => Promise<string>;
  /** False also where there is no hash; an unknown account takes as long as a wrong password. */
  matches: (password: string, hash: string | null) => Promise<boolean>;
};

/**
 * bcrypt with a limited number of hashes at once: each takes a core for a good part of a second.
 * @param cost base-2 logarithm of the rounds, 4 to 15
 */
export function passwordHasher(cost = 12, atOnce = 3): PasswordHasher {
  const inTurn = limited(atOnce);
  let stranger: Promise<string> | null = null;
  return {
    hash: (password) => inTurn(() => bcrypt.hash(password, cost)),
    matches: (password, hash) =>
      inTurn(async () => {
        stranger ??= bcrypt.hash('nobody has this password', cost);
        const matched = await bcrypt.compare(password, hash ?? (await stranger));
        // More than 72 bytes would be cut silently, so that many passwords would open one account.
        return matched && hash !== null && !bcrypt.truncates(password);
      }),
  };
}

function limited(atOnce: number) {
  const waiting: (() => void)[] = [];
  let free = atOnce;
  return async <T>(work: () => Promise<T>): Promise<T> => {
    if (free > 0) free--;
    else await new Promise<void>((resolve) => waiting.push(resolve));
    try {
      return await work();
    } finally {
      // A place is handed over, so that nobody slips in between.
      const next = waiting.shift();
      if (next) next();
      else free++;
    }
  };
}
