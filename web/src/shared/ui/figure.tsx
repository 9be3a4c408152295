import { NUMBER_SPACE, fullPrecision, setExactly, setNumber } from '../format/format-number';
import { formatUnit } from '../format/format-unit';

interface FigureProps {
  value: number;
  /** As on the sheet (`kg/m^3`); `1` and nothing both mean none. */
  unit?: string;
  /** Significant figures; four unless told. */
  digits?: number;
  /** Show the figure as it is on record instead of rounding it. */
  exactly?: boolean;
}

/** A number in the text: rounded to look at, every digit on hover and on copy (see `copyFullPrecision`). */
export function Figure({ value, unit = '1', digits = 4, exactly = false }: FigureProps) {
  const { mantissa, exponent } = exactly ? setExactly(value) : setNumber(value, digits);
  const set = formatUnit(unit);
  const full = fullPrecision(value);
  return (
    <data
      className="tabular"
      value={full}
      title={set ? `${full} ${set}` : full}
      style={{ whiteSpace: 'nowrap' }}
    >
      {exponent !== null && mantissa === '1' ? null : mantissa}
      {exponent === null ? null : (
        <>
          {mantissa === '1' ? '10' : `${NUMBER_SPACE}×${NUMBER_SPACE}10`}
          <sup>{String(exponent).replace('-', '\u2212')}</sup>
        </>
      )}
      {set ? `${NUMBER_SPACE}${set}` : null}
    </data>
  );
}
