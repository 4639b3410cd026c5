import type { Board } from '#core/board/document.ts';

export const objectKinds = ['regulator', 'source', 'pour', 'via-field', 'sink', 'probe', 'outline', 'cutout'] as const;
export type ObjectKind = (typeof objectKinds)[number];
/** Names one object of the board: `regulator:U1`, `pour:p3`, `cutout:0`, `outline:`. */
export type ObjectKey = `${ObjectKind}:${string}`;

export const outlineKey: ObjectKey = 'outline:';

export const kindWords: Record<ObjectKind, string> = {
  regulator: 'Regulator',
  source: 'Heat source',
  pour: 'Pour',
  'via-field': 'Via field',
  sink: 'Sink',
  probe: 'Probe',
  outline: 'Outline',
  cutout: 'Cut-out',
};

export function objectKey(kind: ObjectKind, id: string | number): ObjectKey {
  return `${kind}:${id}`;
}

export function kindOf(key: ObjectKey): ObjectKind {
  const word = key.slice(0, key.indexOf(':'));
  return objectKinds.find((kind) => kind === word) ?? 'outline';
}

/** Reference, id, or place in the list of cut-outs. */
export function idOf(key: ObjectKey): string {
  return key.slice(key.indexOf(':') + 1);
}

/** Name for people: "U1", "Pour p3", "Cut-out 1", "Outline". */
export function objectName(key: ObjectKey): string {
  const kind = kindOf(key);
  if (kind === 'regulator' || kind === 'source') return idOf(key);
  if (kind === 'outline') return kindWords.outline;
  if (kind === 'cutout') return `${kindWords.cutout} ${Number(idOf(key)) + 1}`;
  return `${kindWords[kind]} ${idOf(key)}`;
}

/** Every object of the board in the order of the object list. */
export function objectKeys(board: Board): ObjectKey[] {
  return [
    ...board.regulators.map((regulator) => objectKey('regulator', regulator.ref)),
    ...board.sources.map((source) => objectKey('source', source.ref)),
    ...board.pours.map((pour) => objectKey('pour', pour.id)),
    ...board.viaFields.map((field) => objectKey('via-field', field.id)),
    ...board.sinks.map((sink) => objectKey('sink', sink.id)),
    ...board.probes.map((probe) => objectKey('probe', probe.id)),
    ...board.outline.cutouts.map((_, index) => objectKey('cutout', index)),
    outlineKey,
  ];
}

export function hasObject(board: Board, key: ObjectKey): boolean {
  return objectKeys(board).includes(key);
}
