import { Command, CommanderError } from "commander";
import { InputError } from "../errors.js";
import { EXIT, type ExitCode, type Io } from "./io.js";
import {
  addBridgeFlags,
  addImportFlags,
  addOutputFlags,
  addPriceFlag,
  addSectionFlags,
  addStringerFlags,
  addTopFlag,
  type Flags,
} from "./options.js";

/**
 * Runs the command line: arguments to options to answer to exit code.
 *
 * @param argv arguments after the program's name
 * @returns 0 found or passed; 1 nothing passes; 2 bad input or usage; 3 a defect of ours
 */
export async function run(argv: readonly string[], io: Io): Promise<ExitCode> {
  let code: ExitCode = EXIT.found;
  const program = build(io, (result) => {
    code = result;
  });
  try {
    await program.parseAsync(argv, { from: "user" });
    return code;
  } catch (error) {
    return report(error, io);
  }
}

function report(error: unknown, io: Io): ExitCode {
  if (error instanceof CommanderError) return error.exitCode === 0 ? EXIT.found : EXIT.badInput;
  if (error instanceof InputError) {
    const faults = error.message.split("\n");
    const head = faults.length === 1 ? "a fault in the input" : `${faults.length} faults in the input`;
    io.stderr(`leanspan: ${head}\n${faults.map((fault) => `  ${fault}\n`).join("")}`);
    return EXIT.badInput;
  }
  io.stderr(`leanspan: a defect in the program, please report it\n${error instanceof Error ? error.stack : String(error)}\n`);
  return EXIT.defect;
}

function build(io: Io, done: (code: ExitCode) => void): Command {
  const program = new Command("leanspan");
  program
    .description("The lightest rolled stringer that carries a road over a simple span, with every number shown.")
    .version(VERSION)
    .exitOverride()
    .configureOutput({ writeOut: io.stdout, writeErr: io.stderr })
    .addHelpText("after", examples(["lightest --span 60 --width 33", "check W36X160 --span 60 --width 33 --count 4 --spacing 8.5"]));
  const add = (name: string, description: string, lines: readonly string[]): Command =>
    program.command(name).description(description).addHelpText("after", examples(lines));

  const lightest = add("lightest", "the lightest options that pass every check", [
    "lightest --span 60 --width 33",
    `lightest --span "62'-6\\"" --width 30 --count 4 --fy 36 --top 3`,
  ]);
  for (const flags of [addStringerFlags, addTopFlag, addPriceFlag, addOutputFlags]) flags(lightest);
  lightest.action(async (flags: Flags) => done(await (await import("./lightest.js")).runLightest(flags, io)));

  const counts = add("counts", "how many stringers across the deck", [
    "counts --span 60 --width 33",
    "counts --span 45 --width 28 --spec lfd --vehicle H20-44 --json",
  ]);
  for (const flags of [addStringerFlags, addOutputFlags]) flags(counts);
  counts.action(async (flags: Flags) => done(await (await import("./counts.js")).runCounts(flags, io)));

  const check = add("check", "every number for one shape", [
    "check W36X160 --span 60 --width 33 --count 4 --spacing 8.5",
    "check W30X116 --span 40 --spacing 7 --spec lfd --no-composite",
  ]).argument("<shape>", "designation of a shape of the list");
  for (const flags of [addStringerFlags, addOutputFlags]) flags(check);
  check.action(async (shape: string, flags: Flags) => done(await (await import("./check.js")).runCheck(shape, flags, io)));

  const loads = add("loads", "what a vehicle does to a simple span", ["loads --span 60", "loads --span 80 --vehicle HS20-44 --json"]);
  for (const flags of [addBridgeFlags, addOutputFlags]) flags(loads);
  loads.action(async (flags: Flags) => done(await (await import("./loads.js")).runLoads(flags, io)));

  const sections = add("sections", "the shapes of the list in use", [
    "sections --shapes 'W30X*'",
    "sections --max-depth 24 --max-weight 100 --json",
  ]);
  for (const flags of [addSectionFlags, addOutputFlags]) flags(sections);
  sections.action(async (flags: Flags) => done(await (await import("./sections.js")).runSections(flags, io)));

  const importing = add("import", "read a list in anybody's columns and units, and check every row of it", [
    "import data/examples/county-yard.csv",
    "import data/examples/service-centre.csv --units metric --json",
  ]).argument("<file>", "list as CSV text, as a spreadsheet saves it");
  addImportFlags(importing).action(async (file: string, flags: Flags) =>
    done(await (await import("./import.js")).runImport(file, flags, io)),
  );

  const init = add("init", "a starting bridge file with every key; what it gives counts as said", [
    "init otter-creek.json --span 62 --width 30 --force",
    "init forest-road.json --span 40 --width 16 --spec lfd --vehicle H15-44 --force",
  ]).argument("<file>", "file to be written");
  addStringerFlags(init)
    .option("--force", "replace an existing file")
    .action(async (file: string, flags: Flags) => done(await (await import("./init.js")).runInit(file, flags, io)));

  return program;
}

const VERSION = "0.1.0";

function examples(lines: readonly string[]): string {
  return `\nExamples:\n${lines.map((line) => `  leanspan ${line}\n`).join("")}`;
}
