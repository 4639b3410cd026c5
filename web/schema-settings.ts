import { config } from 'zod/v4/core';

/**
 * The pages' content policy refuses code made from text, so schemas must not try. It has to run before the first
 * schema is made: it is the first import of every entry, and the build keeps it beside zod itself.
 */
config({ jitless: true });
