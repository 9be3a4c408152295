/** One step of a path in a definition: into a member, or to a list's entry by its name or place. */
export type PathStep = { member: string } | { entry: string };

/** `bounds[Re].stretches[0].hi` as steps; null where it cannot be read without doubt. */
export function pathSteps(path: string): PathStep[] | null {
  const steps: PathStep[] = [];
  const step = /(?:^|\.)([A-Za-z_$-]+)|\[(.*?)\](?=$|\.|\[)/gy;
  let read = 0;
  for (let found = step.exec(path); found; found = step.exec(path)) {
    const [whole, member, entry] = found;
    read += whole.length;
    steps.push(member === undefined ? { entry: entry ?? '' } : { member });
  }
  return read === path.length && steps.length > 0 ? steps : null;
}
