import type { BridgeValues } from "../bridge/bridge.js";
import { KEYS } from "../bridge/fields.js";
import { DECK_BOUND } from "../bridge/resolve.js";
import { readShipped, requireWritable, writeWhole } from "./files.js";
import { gather } from "./gather.js";
import { EXIT, type ExitCode, type Io } from "./io.js";
import type { Flags } from "./options.js";

/** Values no practice gives, invented, to be replaced by the reader's own. */
const EXAMPLE: Readonly<Record<string, string>> = { title: "Example: put in your own title, span and width", span: "62", width: "30" };

/** `leanspan init FILE`: a starting bridge file with every key. */
export async function runInit(path: string, flags: Flags, io: Io): Promise<ExitCode> {
  const filled = flags.bridge === undefined ? withExamples(flags) : flags;
  const { bridge } = gather(filled, { bridge: "layout", shapes: false }).question;
  const target = { path, flag: "FILE" };
  await requireWritable([target], { force: flags.force === true });
  await writeWhole(target, `${JSON.stringify(startingFile(bridge, bridge.sources), null, 2)}\n`);
  const invented = [flags.span === undefined ? "spanFt" : null, flags.width === undefined ? "deck.outToOutFt" : null].filter(
    (key) => key !== null,
  );
  if (invented.length > 0) io.stderr(`leanspan: ${path}: ${invented.join(" and ")} are examples; put in your own.\n`);
  io.stdout(`${path}\n`);
  return EXIT.found;
}

/** Fills in what no practice gives: title, span and width. */
function withExamples(flags: Flags): Flags {
  const titled =
    (flags.set ?? []).some((setting) => setting.startsWith("title=")) || (flags.span !== undefined && flags.width !== undefined);
  return {
    ...flags,
    span: flags.span ?? [EXAMPLE.span],
    width: flags.width ?? [EXAMPLE.width],
    set: [...(flags.set ?? []), ...(titled ? [] : [`title=${EXAMPLE.title}`])],
  };
}

/** Every key in the order of the fields: what was asked for, else the practice's own value, so that null still means "by rule". */
function startingFile(bridge: BridgeValues, sources: Readonly<Record<string, string>>): Record<string, unknown> {
  const practice = JSON.parse(readShipped("practice.json")) as Record<string, unknown>;
  const file: Record<string, unknown> = {};
  for (const key of KEYS) {
    const [group, name] = key.split(".") as [string, string | undefined];
    const pick = (from: Record<string, unknown>): unknown =>
      name === undefined ? from[group] : (from[group] as Record<string, unknown> | undefined)?.[name];
    const byPractice = sources[key] === "practice" && (bridge.deck.kind === "concrete" || !DECK_BOUND.includes(key));
    const value = (byPractice ? pick(practice) : pick(bridge as unknown as Record<string, unknown>)) ?? null;
    if (name === undefined) file[group] = value;
    else file[group] = { ...(file[group] as object | undefined), [name]: value };
  }
  return file;
}
