import { parseCase } from '../case';
import { diagnose } from '../diagnose';
import type { Knowledge } from '../garments/schema';
import { nearestOf } from '../nearest';
import type { Reading } from '../reading';
import { vocabularyOf } from './vocabulary';

export const CASES_MAX = 2000;
export const BYTES_MAX = 5 * 1024 * 1024;

/** The outside world of a command, so that it can be tested without one. */
export interface CommandWorld {
  garments: Readonly<Record<string, Knowledge>>;
  findSigns: (knowledge: Knowledge, phrase: string) => { sign: string; score: number }[];
  /** Bytes of a file, or of standard input for `-`; a string is why it could not be read. */
  read: (path: string) => Uint8Array | string;
}

export type CommandResult = { status: 0; stdout: string } | { status: 2; stderr: string };

const USAGE = 'diagnose <case.json | -> | --vocabulary | --words "<phrase>"';

/** Runs the command line: one JSON answer on standard output, or status 2 and one line that names the fault. */
export function runCommand(args: readonly string[], world: CommandWorld): CommandResult {
  const [first, second] = args;
  const knowledge = Object.values(world.garments)[0]!;
  if (first === '--vocabulary' && args.length === 1) return answer(vocabularyOf(knowledge));
  if (first === '--words' && args.length === 2) return answer({ signs: world.findSigns(knowledge, second!) });
  if (first === undefined || args.length > 1) return refuse(`usage: ${USAGE}`);
  if (first.startsWith('--')) return refuse(`unknown option "${first}"; usage: ${USAGE}`);
  const bytes = world.read(first);
  if (typeof bytes === 'string') return refuse(`cannot read ${JSON.stringify(first)}: ${bytes}`);
  if (bytes.length > BYTES_MAX) return refuse('the input is above 5 MB');
  return diagnoseText(new TextDecoder().decode(bytes), world);
}

function diagnoseText(text: string, { garments }: CommandWorld): CommandResult {
  let input: unknown;
  try {
    input = JSON.parse(text);
  } catch (error) {
    return refuse(`case: not JSON (${error instanceof Error ? error.message : String(error)})`);
  }
  if (!Array.isArray(input)) {
    const read = readOne(input, garments, '');
    return typeof read === 'string' ? refuse(read) : answer(read());
  }
  if (input.length > CASES_MAX)
    return refuse(`an array holds at most ${CASES_MAX} cases, this one ${input.length}`);
  const started = input.map((one: unknown, i) => readOne(one, garments, `[${i}]`));
  const fault = started.find((one) => typeof one === 'string');
  if (typeof fault === 'string') return refuse(fault);
  return answer(started.map((one) => (typeof one === 'string' ? null : one())));
}

/** A case made ready to be read, or what is wrong with it. */
function readOne(input: unknown, garments: CommandWorld['garments'], at: string): (() => Reading) | string {
  const asked = typeof input === 'object' && input !== null && 'garment' in input ? input.garment : undefined;
  const knowledge = typeof asked === 'string' && Object.hasOwn(garments, asked) ? garments[asked] : undefined;
  if (typeof asked === 'string' && !knowledge) {
    const near = nearestOf(asked, Object.keys(garments));
    return faultText(at, 'garment', `unknown garment "${asked}"; nearest is "${near}"`);
  }
  const parsed = parseCase(knowledge ?? Object.values(garments)[0]!, input);
  return parsed.ok
    ? () => diagnose(knowledge!, parsed.value)
    : faultText(at, parsed.fault.field, parsed.fault.message);
}

function faultText(at: string, field: string, message: string): string {
  return `${at}${at && !field.startsWith('[') ? '.' : ''}${field}: ${message}`;
}

function answer(value: unknown): CommandResult {
  return { status: 0, stdout: `${JSON.stringify(value)}\n` };
}

function refuse(message: string): CommandResult {
  return { status: 2, stderr: `${message.replace(/\s+/g, ' ')}\n` };
}
