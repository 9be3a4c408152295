/** What values a quantity can have at all; anything else is an input error at that field. */
export type Sign = 'positive' | 'non-negative' | 'any';

/** One entry of the quantity dictionary: what a symbol stands for, whatever letter a sheet gives it. */
export interface DictionaryEntry {
  title: string;
  /** Coherent SI unit, which also fixes the dimension. */
  unit: string;
  /** Unit that people have the value in, where it is not the SI one: forms start with it. */
  usual?: string;
  /** The only units to offer, where others of the same dimension would be another thing. */
  offered?: readonly string[];
  /** A part of a whole, which may be given in per cent as well. */
  fraction?: boolean;
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
