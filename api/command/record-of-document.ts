import type { Board } from '#core/board/document.ts';
import { buildRecord } from '#core/record/build-record.ts';
import type { CheckResult } from '#core/result/result.ts';
import type { HeatField } from '#core/thermal/heat-field.ts';
import { renderRecord } from '../record/render-record.ts';

/** The record of a document that belongs to no revision, on A4. */
export function recordOfDocument(
  board: Board,
  result: CheckResult,
  fields: ReadonlyMap<string, HeatField>,
): Promise<Buffer> {
  return renderRecord(buildRecord({ board, result, fields, revision: null }), 'a4');
}
