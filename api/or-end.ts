/** Waits for what the start needs; where it fails, the process ends with one line that says what and why. */
export async function orEnd<T>(what: string, needed: Promise<T>): Promise<T> {
  try {
    return await needed;
  } catch (error) {
    // Several addresses of one host fail together; the first one tells enough.
    const first: unknown = error instanceof AggregateError ? error.errors[0] : error;
    process.stderr.write(`${what}: ${first instanceof Error ? first.message : String(first)}\n`);
    process.exit(1);
  }
}
