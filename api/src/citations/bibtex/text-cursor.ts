import { CitationFault } from '../citation-fault.js';
import { READING_LIMITS } from '../reading-limits.js';

/** A place in a text that only moves forward. */
export class TextCursor {
  private at = 0;
  private countedTo = 0;
  private lines = 1;

  constructor(private readonly text: string) {}

  /** The character at the place; empty at the end. */
  get next(): string {
    return this.text[this.at] ?? '';
  }

  /** Line of the place, from 1. */
  get line(): number {
    for (; this.countedTo < this.at; this.countedTo += 1)
      if (this.text[this.countedTo] === '\n') this.lines += 1;
    return this.lines;
  }

  step(): string {
    const character = this.next;
    this.at += 1;
    return character;
  }

  skipPast(character: string): boolean {
    const found = this.text.indexOf(character, this.at);
    this.at = found < 0 ? this.text.length : found + 1;
    return found >= 0;
  }

  /** Moves over spaces and comments of TeX. */
  skipSpace(): void {
    while (this.take(/\s+|%[^\n]*/y) !== '');
  }

  /** What a sticky pattern finds at the place; empty where it finds nothing. */
  take(pattern: RegExp): string {
    pattern.lastIndex = this.at;
    const found = pattern.exec(this.text)?.[0] ?? '';
    this.at += found.length;
    return found;
  }

  expect(character: string, of: string): void {
    if (this.step() === character) return;
    this.at -= 1;
    this.fail(`"${character}" is missing in ${of}.`);
  }

  /** The text up to the end of the group that was opened, whose braces must balance within. */
  takeGroup(close: '}' | '"'): string {
    const from = this.at;
    this.skipGroup(close);
    return this.text.slice(from, this.at - 1);
  }

  skipGroup(close: string): void {
    const opened = this.line;
    for (let depth = 0; this.at < this.text.length;) {
      const character = this.step();
      if (character === close && depth === 0) return;
      if (character === '{') depth += 1;
      if (character === '}') depth -= 1;
      if (depth < 0) this.fail('There is a closing brace too many.');
      if (depth > READING_LIMITS.braceDepth) {
        this.fail(`Braces are nested deeper than ${READING_LIMITS.braceDepth} levels.`);
      }
    }
    throw new CitationFault(`What is opened in line ${opened} is never closed.`);
  }

  fail(message: string): never {
    throw new CitationFault(`Line ${this.line}: ${message}`);
  }
}
