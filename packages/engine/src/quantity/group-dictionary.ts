/** What a symbol of a group's usual definition stands for, and which quantities of a sheet can take its place. */
export interface GroupSlot {
  /** In words, as it is asked for where the sheet has nothing that fits. */
  readonly words: string;
  /** Coherent SI unit; a quantity of another dimension never fits. */
  readonly unit: string;
  /** The quantity that has this role on the sheet. */
  readonly role?: 'characteristic-length' | 'velocity';
  /** Dictionary names that fit. */
  readonly names: readonly string[];
}

/** A named dimensionless number with the definition that most of the literature on mass transfer means by it. */
export interface GroupEntry {
  readonly symbol: string;
  readonly name: string;
  /** In the symbols of `GROUP_SLOTS` and the constants. */
  readonly expression: string;
  /** What it sets against what, or where authors differ. */
  readonly hint: string;
}

/** The symbols in which the dictionary of groups is written. */
export const GROUP_SLOTS = {
  rho: { words: 'density', unit: 'kg/m^3', names: ['fluid-density', 'gas-density', 'liquid-density'] },
  mu: { words: 'viscosity', unit: 'Pa s', names: ['fluid-viscosity', 'gas-viscosity', 'liquid-viscosity'] },
  D: {
    words: 'diffusivity',
    unit: 'm^2/s',
    names: ['fluid-diffusivity', 'gas-diffusivity', 'liquid-diffusivity'],
  },
  u: { words: 'velocity', unit: 'm/s', role: 'velocity', names: [] },
  d: { words: 'characteristic length', unit: 'm', role: 'characteristic-length', names: [] },
  L: {
    words: 'length along the flow',
    unit: 'm',
    names: [
      'tube-length',
      'channel-length',
      'fibre-length',
      'active-length',
      'plate-length',
      'wetted-height',
    ],
  },
  omega: { words: 'angular speed', unit: 'rad/s', names: ['angular-speed'] },
  t: { words: 'time of contact', unit: 's', names: ['contact-time'] },
  sigma: { words: 'surface tension', unit: 'N/m', names: ['surface-tension'] },
  delta_rho: { words: 'density difference', unit: 'kg/m^3', names: ['density-difference'] },
  a_T: { words: 'thermal diffusivity', unit: 'm^2/s', names: [] },
  d_c: { words: 'diameter of the coil', unit: 'm', names: ['coil-diameter'] },
  k: { words: 'mass transfer coefficient', unit: 'm/s', names: [] },
} as const satisfies Readonly<Record<string, GroupSlot>>;

/**
 * Named groups with their usual definitions, most used first. Names and forms follow ISO 80000-11:2019 (from memory)
 * where it has them; where the trade writes another form (Fr squared, Ga and Gr with the density difference) the hint
 * says so.
 */
export const GROUPS: readonly GroupEntry[] = [
  {
    symbol: 'Re',
    name: 'Reynolds number',
    expression: 'rho*u*d/mu',
    hint: 'Inertia over viscosity; say on which length and which velocity.',
  },
  {
    symbol: 'Sc',
    name: 'Schmidt number',
    expression: 'mu/(rho*D)',
    hint: 'Momentum diffusivity over that of the species.',
  },
  {
    symbol: 'Sh',
    name: 'Sherwood number',
    expression: 'k*d/D',
    hint: 'The coefficient made dimensionless. Where the sheet gives it as its result it is no group of the sheet.',
  },
  {
    symbol: 'Pe',
    name: 'Peclet number for mass transfer',
    expression: 'u*d/D',
    hint: 'Equal to Re times Sc.',
  },
  {
    symbol: 'Gz',
    name: 'Graetz number for mass transfer',
    expression: 'u*d^2/(D*L)',
    hint: 'Equal to Re Sc d/L. Others put a factor of pi/4 in front: hold it against the source.',
  },
  {
    symbol: 'St',
    name: 'Stanton number for mass transfer',
    expression: 'k/u',
    hint: 'Equal to Sh/(Re Sc).',
  },
  {
    symbol: 'j_D',
    name: 'Factor j for mass transfer',
    expression: 'k/u*(mu/(rho*D))^(2/3)',
    hint: 'Stanton number times Sc to two thirds (Chilton and Colburn).',
  },
  {
    symbol: 'Gr',
    name: 'Grashof number for mass transfer',
    expression: 'g*rho*delta_rho*d^3/mu^2',
    hint: 'Buoyancy over viscosity, with the density difference from phase boundary to bulk.',
  },
  {
    symbol: 'Ra',
    name: 'Rayleigh number for mass transfer',
    expression: 'g*delta_rho*d^3/(mu*D)',
    hint: 'Equal to Gr times Sc.',
  },
  {
    symbol: 'Ga',
    name: 'Galilei number',
    expression: 'g*rho^2*d^3/mu^2',
    hint: 'Weight over viscosity. With the density difference in place of one density it is Archimedes’ number.',
  },
  {
    symbol: 'Ar',
    name: 'Archimedes number',
    expression: 'g*rho*delta_rho*d^3/mu^2',
    hint: 'Like Gr, for a particle, drop or bubble in a fluid.',
  },
  {
    symbol: 'We',
    name: 'Weber number',
    expression: 'rho*u^2*d/sigma',
    hint: 'Inertia over surface tension.',
  },
  {
    symbol: 'Fr',
    name: 'Froude number',
    expression: 'u^2/(g*d)',
    hint: 'Inertia over weight. Others mean the root of this: hold it against the source.',
  },
  {
    symbol: 'Eo',
    name: 'Eotvos number',
    expression: 'g*delta_rho*d^2/sigma',
    hint: 'Buoyancy over surface tension; the Bond number is the same.',
  },
  {
    symbol: 'Bo',
    name: 'Bond number',
    expression: 'g*rho*d^2/sigma',
    hint: 'Weight over surface tension, with the density of the liquid.',
  },
  {
    symbol: 'Mo',
    name: 'Morton number',
    expression: 'g*mu^4*delta_rho/(rho^2*sigma^3)',
    hint: 'Of the fluids alone. Beside a gas the density difference is often taken as the liquid’s density.',
  },
  {
    symbol: 'Ca',
    name: 'Capillary number',
    expression: 'mu*u/sigma',
    hint: 'Viscosity over surface tension.',
  },
  {
    symbol: 'Le',
    name: 'Lewis number',
    expression: 'a_T/D',
    hint: 'Thermal diffusivity over that of the species, Sc/Pr. Some books have it upside down.',
  },
  {
    symbol: 'Fo',
    name: 'Fourier number for mass transfer',
    expression: 'D*t/d^2',
    hint: 'Time against the time that diffusion needs; on the radius or the diameter, as the source has it.',
  },
  {
    symbol: 'Re_w',
    name: 'Reynolds number of a rotating body',
    expression: 'rho*omega*d^2/mu',
    hint: 'On radius and angular speed for a disc. On the peripheral velocity and the diameter it is twice or half that.',
  },
  {
    symbol: 'De',
    name: 'Dean number',
    expression: 'rho*u*d/mu*(d/d_c)^0.5',
    hint: 'Re times the root of tube over coil diameter.',
  },
];
