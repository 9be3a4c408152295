/** Whether a path such as `bounds[0].stretches` leads to something in a definition. The empty path is the whole. */
export function leadsSomewhere(definition: unknown, path: string): boolean {
  if (path === '') return true;
  const names = path.replaceAll(/\[(\d+)\]/g, '.$1').split('.');
  let here = definition;
  for (const name of names) {
    if (typeof here !== 'object' || here === null || !Object.hasOwn(here, name)) return false;
    here = (here as Record<string, unknown>)[name];
  }
  return true;
}
