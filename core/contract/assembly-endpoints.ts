import {
  assemblyView,
  changeAssemblyBody,
  createAssemblyBody,
  openNextRevisionBody,
  revisionView,
} from './assemblies.ts';
import { endpoint } from './endpoint.ts';
import { assemblyParams, list } from './parameters.ts';

/** Assemblies and their revisions. */
export const assemblyEndpoints = {
  listAssemblies: endpoint({
    method: 'get',
    path: '/assemblies',
    summary: 'Assemblies of the team with their revisions',
    access: 'member',
    status: 200,
    answer: list(assemblyView),
  }),
  createAssembly: endpoint({
    method: 'post',
    path: '/assemblies',
    summary: 'Create an assembly with revision A',
    access: { team: 'create-assembly' },
    body: createAssemblyBody,
    status: 201,
    answer: assemblyView,
    idempotent: true,
  }),
  readAssembly: endpoint({
    method: 'get',
    path: '/assemblies/{assemblyId}',
    summary: 'One assembly',
    access: 'member',
    params: assemblyParams,
    status: 200,
    answer: assemblyView,
  }),
  changeAssembly: endpoint({
    method: 'patch',
    path: '/assemblies/{assemblyId}',
    summary: 'Change number or title',
    access: { team: 'create-assembly' },
    params: assemblyParams,
    body: changeAssemblyBody,
    status: 200,
    answer: assemblyView,
  }),
  openNextRevision: endpoint({
    method: 'post',
    path: '/assemblies/{assemblyId}/revisions',
    summary: 'Open the next revision from an earlier one',
    access: { revision: 'open-next' },
    params: assemblyParams,
    body: openNextRevisionBody,
    status: 201,
    answer: revisionView,
    idempotent: true,
  }),
} as const;
