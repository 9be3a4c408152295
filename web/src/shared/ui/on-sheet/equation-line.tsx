import type { LineTex } from '@merestone/engine';
import { Equation, InlineEquation } from '../equation';

interface EquationLineProps {
  line: LineTex;
  /** The handbook's number; without one none is set. */
  number?: number;
}

/** One equation of a sheet; of pieces each with the conditions it holds under, all under one number. */
export function EquationLine({ line, number }: EquationLineProps) {
  return line.formulas.map(({ tex, whenTex, title }, i) => (
    <Equation
      key={tex + (whenTex ?? '')}
      tex={`${line.symbolTex} = ${tex}`}
      {...(number === undefined ? {} : { number: line.formulas.length === 1 ? number : lettered(number, i) })}
    >
      {whenTex ? (
        <>
          {title ? `${title}: ` : 'for '}
          <InlineEquation tex={whenTex} />
        </>
      ) : null}
    </Equation>
  ));
}

function lettered(number: number, place: number): string {
  return `${number}${'abcdefghijklmnopqrstuvwxyz'[place] ?? ''}`;
}
