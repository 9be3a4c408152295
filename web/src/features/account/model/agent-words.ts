const BROWSERS: readonly [RegExp, string][] = [
  [/\bFirefox\//, 'Firefox'],
  [/\bEdg(e|A|iOS)?\//, 'Edge'],
  [/\b(Chromium|HeadlessChrome)\//, 'Chromium'],
  [/\bChrome\//, 'Chrome'],
  [/\bVersion\/[\d.]+.*Safari\//, 'Safari'],
  [/^curl\//, 'curl'],
];

const SYSTEMS: readonly [RegExp, string][] = [
  [/\b(iPhone|iPad)\b/, 'iOS'],
  [/\bAndroid\b/, 'Android'],
  [/\bWindows\b/, 'Windows'],
  [/\bMac OS X\b/, 'macOS'],
  [/\bLinux\b/, 'Linux'],
];

const LONGEST = 60;

/** What a browser says of itself, in words: `Firefox on Linux`. It is a claim: anything can be sent. */
export function agentWords(agent: string): string {
  const first = (table: readonly [RegExp, string][]) => table.find(([sign]) => sign.test(agent))?.[1];
  const browser = first(BROWSERS);
  const system = first(SYSTEMS);
  if (browser) return system ? `${browser} on ${system}` : browser;
  if (agent.trim() === '') return 'Something that does not say what it is';
  return agent.length > LONGEST ? `${agent.slice(0, LONGEST)} …` : agent;
}
