import { type Database, only } from './database.ts';

export type Team = { id: string; name: string };

export async function insertTeam(database: Database, team: Team): Promise<void> {
  await database('teams').insert(team);
}

export async function renameTeam(database: Database, id: string, name: string): Promise<Team> {
  return only(await database('teams').where({ id }).update({ name }).returning<Team[]>(['id', 'name']));
}

export async function findTeamByName(database: Database, name: string): Promise<Team | null> {
  return (await database('teams').where({ name }).first<Team | undefined>('id', 'name')) ?? null;
}
