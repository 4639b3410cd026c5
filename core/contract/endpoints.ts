import { assemblyEndpoints } from './assembly-endpoints.ts';
import { referenceEndpoints } from './reference-endpoints.ts';
import { reviewEndpoints } from './review-endpoints.ts';
import { serviceEndpoints } from './service-endpoints.ts';
import { sessionEndpoints } from './session-endpoints.ts';
import { sketchEndpoints } from './sketch-endpoints.ts';
import { solvingEndpoints } from './solving-endpoints.ts';
import { teamEndpoints } from './team-endpoints.ts';

/** Every endpoint of the product; routes, OpenAPI and the web client are made from this table. */
export const endpoints = {
  ...serviceEndpoints,
  ...sessionEndpoints,
  ...teamEndpoints,
  ...assemblyEndpoints,
  ...sketchEndpoints,
  ...solvingEndpoints,
  ...reviewEndpoints,
  ...referenceEndpoints,
} as const;

export type EndpointName = keyof typeof endpoints;
