/** Air at 25 °C in a 25 mm wetted tube, by symbol in the sheet's own units: Re about 8 850, Sc about 0.61. */
export const AIR: Readonly<Record<string, string>> = {
  d: '0.025',
  u: '5.5',
  rho: '1.184',
  mu: '1.84e-5',
  D: '2.54e-5',
  P: '101325',
  p_BM: '99800',
};
