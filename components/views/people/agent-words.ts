/** A browser's long name of itself in two words, for a list of sessions. */
const BROWSERS = [
  ['Edg/', 'Edge'],
  ['Firefox/', 'Firefox'],
  ['Chrome/', 'Chrome'],
  ['Safari/', 'Safari'],
] as const;
const SYSTEMS = [
  ['Android', 'Android'],
  ['iPhone', 'iPhone'],
  ['iPad', 'iPad'],
  ['Windows', 'Windows'],
  ['Mac OS', 'macOS'],
  ['Linux', 'Linux'],
] as const;

/** `Firefox on Linux`; the name itself where it is an unknown one. The first that fits counts: names repeat others' names. */
export function agentWords(agent: string | null): string {
  if (!agent) return 'A browser without a name';
  const browser = BROWSERS.find(([mark]) => agent.includes(mark))?.[1];
  const system = SYSTEMS.find(([mark]) => agent.includes(mark))?.[1];
  if (browser === undefined) return agent.slice(0, 60);
  return system === undefined ? browser : `${browser} on ${system}`;
}
