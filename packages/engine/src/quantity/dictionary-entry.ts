/** What values a quantity can have at all; anything else is an input error at that field. */
export type Sign = 'positive' | 'non-negative' | 'any';

/** One entry of the quantity dictionary: what a symbol stands for, whatever letter a sheet gives it. */
export interface DictionaryEntry {
  title: string;
  /** Coherent SI unit, which also fixes the dimension. */
  unit: string;
  /** Usual symbol, ASCII as in expressions. */
  symbol: string;
  sign: Sign;
  /** One line that keeps people from the usual slip. */
  hint?: string;
  /** Narrower entries whose value serves here as well (fluid-density: gas-density, liquid-density). */
  covers?: readonly string[];
  /** A difference of temperatures: no offset between °C and K. */
  difference?: boolean;
  /** Absolute pressure, for which a gauge reading needs the atmosphere added. */
  absolutePressure?: boolean;
}

export type DictionaryPart = Readonly<Record<string, DictionaryEntry>>;
