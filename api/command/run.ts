import { boardJsonSchema } from '#core/board/json-schema.ts';
import { check } from './check.ts';
import { exitCodes } from './exit-codes.ts';
import { help } from './help.ts';
import { print, printError } from './print.ts';

/** The command line. @returns the exit code */
export async function run(words: readonly string[]): Promise<number> {
  const [command, ...rest] = words;
  switch (command) {
    case 'check':
      return await check(rest);
    case 'schema':
      if (rest.length > 0) return usage(`schema takes no arguments, found "${rest[0]}"`);
      await print(`${JSON.stringify(boardJsonSchema(), null, 2)}\n`);
      return exitCodes.fine;
    case 'help':
    case '--help':
    case '-h':
      await print(help);
      return exitCodes.fine;
    case undefined:
      return usage('a command is missing');
    default:
      return usage(`"${command}" is no command`);
  }
}

function usage(message: string): number {
  printError(`dropwatt: ${message}; see dropwatt --help`);
  return exitCodes.invalid;
}
