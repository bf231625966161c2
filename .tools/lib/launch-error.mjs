/** Something a person has to put right; its message is one line that says what and how. */
export class LaunchError extends Error {
  constructor(message) {
    super(message);
    this.name = 'LaunchError';
  }
}

/** Runs a launcher's main function; a foreseen failure is one line, anything else keeps its stack. */
export async function launch(main) {
  try {
    process.exitCode = await main();
  } catch (error) {
    console.error(error instanceof LaunchError ? `Bandledger: ${error.message}` : error);
    process.exitCode = 1;
  }
}
