/** Air at 25 °C in a 25 mm wetted tube, by symbol in the units the form starts with: Re about 8 850, Sc about 0.61. */
export const AIR: Readonly<Record<string, string>> = {
  d: '25',
  u: '5.5',
  rho: '1.184',
  mu: '1.84e-5',
  D: '2.54e-5',
  P: '101.325',
  p_BM: '99.8',
};
