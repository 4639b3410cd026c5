/** Tokens of JSON (RFC 8259), each from where it stands; `lastIndex` drives them. */
const space = /[ \t\n\r]*/y;
const scalar =
  /"(?:[ !#-[\]-\uffff]|\\(?:["\\/bfnrt]|u[0-9a-fA-F]{4}))*"|-?(?:0|[1-9]\d*)(?:\.\d+)?(?:[eE][+-]?\d+)?|true|false|null/y;

/**
 * Where a text stops being JSON: the index of the first token that may not stand there, the text's length when it ends too
 * early, null when all of it is JSON. Iterative, so that nesting cannot exhaust the stack.
 */
export function jsonFaultAt(text: string): number | null {
  const open: ('{' | '[')[] = [];
  let at = 0;
  let expected: 'value' | 'value or ]' | 'key' | 'key or }' | ':' | ', or end' = 'value';
  const skip = () => {
    space.lastIndex = at;
    space.test(text);
    at = space.lastIndex;
  };
  for (;;) {
    skip();
    const top = open.at(-1);
    if (expected === ', or end' && top === undefined) return at === text.length ? null : at;
    const character = text[at];
    if (character === undefined) return text.length;
    const closes = top === '[' ? ']' : '}';
    if (character === closes && (expected === ', or end' || expected === 'value or ]' || expected === 'key or }')) {
      open.pop();
      expected = ', or end';
      at++;
    } else if (expected === ', or end') {
      if (character !== ',') return at;
      expected = top === '[' ? 'value' : 'key';
      at++;
    } else if (expected === ':') {
      if (character !== ':') return at;
      expected = 'value';
      at++;
    } else if (expected.startsWith('value') && (character === '{' || character === '[')) {
      open.push(character);
      expected = character === '{' ? 'key or }' : 'value or ]';
      at++;
    } else {
      const isKey = expected.startsWith('key');
      scalar.lastIndex = at;
      if ((isKey && character !== '"') || !scalar.test(text)) return at;
      at = scalar.lastIndex;
      expected = isKey ? ':' : ', or end';
    }
  }
}
