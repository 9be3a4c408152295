interface Level {
  /** Names seen so far; undefined inside an array. */
  readonly keys: Set<string> | undefined;
  /** Name or index of what is being read. */
  place: string | number;
}

/**
 * Path of the first name that stands twice in one object of a JSON text, of which `JSON.parse` keeps the last without
 * a word; undefined when there is none. The text must be valid JSON.
 */
export function findDuplicateKey(text: string): string | undefined {
  const levels: Level[] = [];
  let awaitsKey = false;
  for (let at = 0; at < text.length; at += 1) {
    const level = levels.at(-1);
    switch (text[at]) {
      case '{':
        levels.push({ keys: new Set(), place: '' });
        awaitsKey = true;
        break;
      case '[':
        levels.push({ keys: undefined, place: 0 });
        awaitsKey = false;
        break;
      case '}':
      case ']':
        levels.pop();
        awaitsKey = false;
        break;
      case ',':
        awaitsKey = level?.keys !== undefined;
        if (typeof level?.place === 'number') level.place += 1;
        break;
      case '"': {
        const token = stringAt(text, at);
        at += token.length - 1;
        if (!awaitsKey || level?.keys === undefined) break;
        const key = String(JSON.parse(token));
        level.place = key;
        if (level.keys.has(key)) return levels.map(({ place }) => place).join('.');
        level.keys.add(key);
        awaitsKey = false;
        break;
      }
      default:
    }
  }
  return undefined;
}

/** The string literal that begins at a place, quotes included. */
function stringAt(text: string, at: number): string {
  let end = at + 1;
  while (end < text.length && text[end] !== '"') end += text[end] === '\\' ? 2 : 1;
  return text.slice(at, end + 1);
}
