import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { loadEnvironment, SettingFault } from '#api/env.ts';

const fine = {
  DATABASE_URL: 'postgres://a:b@127.0.0.1:5432/c',
  SESSION_SECRET: 'x'.repeat(32),
  SMTP_URL: 'smtp://127.0.0.1:2525',
  MAIL_FROM: 'Dropwatt <dropwatt@example.org>',
};

test('settings – the least that is needed – get their defaults', () => {
  const environment = loadEnvironment(fine);
  expect(environment.PORT).toBe(4680);
  expect(environment.PUBLIC_URL).toBe('http://127.0.0.1:4680');
});

test.each([
  ['PORT', '99999'],
  ['PORT', '4680x'],
  ['DATABASE_URL', 'mysql://a'],
  ['SESSION_SECRET', 'short'],
  ['LOG_LEVEL', 'loud'],
])('settings – %s=%s – is refused by its name', (name, value) => {
  const load = () => loadEnvironment({ ...fine, [name]: value });
  expect(load).toThrow(SettingFault);
  expect(load).toThrow(new RegExp(`^${name} must`));
});

test('.env.example – its names – are those that the program reads', () => {
  const text = readFileSync(join(import.meta.dirname, '../../.env.example'), 'utf8');
  const named = [...text.matchAll(/^([A-Z_]+)=/gm)].map(([, name]) => name);
  const read = Object.keys(loadEnvironment({ ...fine, MAIL_SINK_FOLDER: 'mail' }));
  expect(new Set(named)).toEqual(new Set(read));
});
