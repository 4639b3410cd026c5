import { z } from 'zod';

export const role = z.enum([
  'layout-designer',
  'thermal-reviewer',
  'quality-engineer',
  'hardware-lead',
  'test-engineer',
  'administrator',
]);
export type Role = z.output<typeof role>;

export const roleNames: Record<Role, string> = {
  'layout-designer': 'Layout designer',
  'thermal-reviewer': 'Thermal reviewer',
  'quality-engineer': 'Quality engineer',
  'hardware-lead': 'Hardware lead',
  'test-engineer': 'Test engineer',
  administrator: 'Administrator',
};
