import { z } from 'zod';
import data from './published-accuracy.json' with { type: 'json' };
import { publishedCase, type PublishedCase } from './published-case.ts';

/** Written by `make accuracy WRITE=1`; a test holds it against the present method. */
export const publishedAccuracy: readonly PublishedCase[] = z.array(publishedCase).parse(data);
