/** Something a person can mend: told in one sentence, without a stack. */
export class Failure extends Error {
  constructor(message, exitCode = 1) {
    super(message);
    this.name = 'Failure';
    this.exitCode = exitCode;
  }
}

/** Runs a script's main function; a Failure ends it with its sentence, anything else with its stack. */
export async function runMain(main) {
  try {
    process.exitCode = (await main()) ?? 0;
  } catch (error) {
    console.error(error instanceof Failure ? error.message : error);
    process.exitCode = error instanceof Failure ? error.exitCode : 1;
  }
}
