/** What may come next in a JSON text. */
type Wanted = 'value' | 'value or ]' | 'name or }' | 'name' | ':' | ', or }' | ', or ]' | 'end';

const blank = /[ \t\r\n]*/y;
const plain = /-?(?:0|[1-9]\d*)(?:\.\d+)?(?:[eE][+-]?\d+)?(?![\w.+-])|true(?!\w)|false(?!\w)|null(?!\w)/y;
/** A number or word that the end of the text cuts in two. */
const begun = /(?:-?\d*\.?\d*(?:[eE][+-]?\d*)?|t|tr|tru|f|fa|fal|fals|n|nu|nul)$/y;

/** Where the string that begins at `from` ends, and whether it is one. Read by hand: it may be a million characters. */
function endOfString(json: string, from: number): { readonly to: number; readonly is: boolean } {
  for (let at = from + 1; at < json.length; at++) {
    const c = json.charCodeAt(at);
    if (c === 34) return { to: at + 1, is: true };
    if (c < 32) return { to: at, is: false };
    if (c !== 92) continue;
    const rest = json.slice(at + 1, at + 6);
    const whole = /^(?:["\\/bfnrt]|u[0-9a-fA-F]{4})/.exec(rest)?.[0];
    if (whole === undefined) {
      const cut = at + 1 + rest.length >= json.length && /^(?:u[0-9a-fA-F]*)?$/.test(rest);
      return { to: cut ? json.length : at, is: false };
    }
    at += whole.length;
  }
  return { to: json.length, is: false };
}

/**
 * Where a text stops being JSON (RFC 8259), because engines word and place this differently. `cutOff`: all
 * that is there is right and the rest is absent.
 */
export function jsonFault(json: string): { readonly offset: number; readonly cutOff: boolean } {
  const open: ('{' | '[')[] = [];
  let wanted: Wanted = 'value';
  let at = 0;
  const take = (pattern: RegExp): boolean => {
    pattern.lastIndex = at;
    const found = pattern.exec(json);
    if (found === null) return false;
    at += found[0].length;
    return true;
  };
  const closed = (): Wanted => {
    const around = open.at(-1);
    return around === undefined ? 'end' : around === '{' ? ', or }' : ', or ]';
  };
  for (;;) {
    take(blank);
    if (at >= json.length) return { offset: json.length, cutOff: true };
    const c = json[at];
    const wantsName: boolean = wanted === 'name' || wanted === 'name or }';
    const wantsValue: boolean = wanted === 'value' || wanted === 'value or ]';
    if ((c === '}' && wanted.endsWith('or }')) || (c === ']' && wanted.endsWith('or ]'))) {
      open.pop();
      at++;
      wanted = closed();
    } else if (c === ',' && wanted.startsWith(',')) {
      at++;
      wanted = wanted === ', or }' ? 'name' : 'value';
    } else if (c === ':' && wanted === ':') {
      at++;
      wanted = 'value';
    } else if (c === '"' && (wantsName || wantsValue)) {
      const { to, is } = endOfString(json, at);
      if (!is) return { offset: to, cutOff: to >= json.length };
      at = to;
      wanted = wantsName ? ':' : closed();
    } else if ((c === '{' || c === '[') && wantsValue) {
      open.push(c);
      at++;
      wanted = c === '{' ? 'name or }' : 'value or ]';
    } else if (wantsValue && take(plain)) {
      wanted = closed();
    } else {
      begun.lastIndex = at;
      return { offset: at, cutOff: wantsValue && begun.test(json) };
    }
  }
}
