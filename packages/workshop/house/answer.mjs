import { CannotGoOn } from './prerequisites.mjs';

/**
 * Runs a script's main function and ends the process with its exit code. A reason to stop is printed plainly.
 * @param {() => Promise<number>} main
 */
export const answer = async (main) => {
  try {
    process.exitCode = await main();
  } catch (error) {
    if (!(error instanceof CannotGoOn)) throw error;
    console.error(error.message);
    process.exitCode = 1;
  }
};
