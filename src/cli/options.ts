import { type Command, InvalidArgumentError, Option } from "commander";

/** Flags as commander hands them over; texts are not read yet, and a flag given twice stands twice. */
export interface Flags {
  readonly bridge?: string[];
  readonly practice?: string[];
  readonly sections?: string[];
  readonly vehicles?: string[];
  readonly spec?: string[];
  readonly span?: string[];
  readonly width?: string[];
  readonly count?: string[];
  readonly spacing?: string[];
  readonly grade?: string[];
  readonly fy?: string[];
  readonly vehicle?: string[];
  readonly dead?: string[];
  readonly maxDepth?: string[];
  readonly composite?: boolean;
  /** Both spellings of the composite flag as met, so that a contradiction is seen. */
  readonly compositeWords?: string[];
  readonly minDepth?: string[];
  readonly minWeight?: string[];
  readonly maxWeight?: string[];
  readonly shapes?: string[];
  readonly without?: string[];
  readonly set?: string[];
  /** Another list that `sections` compares the list in use with. */
  readonly against?: string;
  /** Flags of `import`. */
  readonly out?: string;
  readonly refused?: string;
  readonly map?: string[];
  readonly units?: string[];
  readonly top?: number;
  readonly price?: boolean;
  readonly json?: boolean;
  readonly csv?: string;
  readonly force?: boolean;
}

const collect = (text: string, before: string[] | undefined): string[] => [...(before ?? []), text];

function once(text: string, before: string | undefined): string {
  if (before !== undefined) throw new InvalidArgumentError("It stands twice; once is allowed.");
  return text;
}

function wholeNumber(text: string): number {
  const value = Number(text);
  if (!/^\d+$/.test(text) || value < 1 || value > 1000) throw new InvalidArgumentError("A whole number from 1 to 1000 is allowed.");
  return value;
}

const list = (flags: string, description: string): Option => new Option(flags, description).argParser(collect);

/** Flags of every command that asks about a bridge. */
export function addBridgeFlags(command: Command): Command {
  return command
    .addOption(list("--bridge <file>", "bridge file (JSON)"))
    .addOption(list("--practice <file>", "an agency's defaults and limits, over the shipped ones"))
    .addOption(list("--vehicles <file>", "vehicles of your own (JSON), added to the known ones"))
    .addOption(list("--spec <name>", "specification: lrfd or lfd"))
    .addOption(list("--span <ft>", `span between bearings, such as 62.5 or 62'-6"`))
    .addOption(list("--vehicle <name>", "live load, such as HS20-44"))
    .addOption(list("--set <key=value>", "any key of the bridge file; repeatable"));
}

/** Flags of the commands that choose or check stringers. */
export function addStringerFlags(command: Command): Command {
  addBridgeFlags(command)
    .addOption(list("--width <ft>", "deck from edge to edge"))
    .addOption(list("--count <n>", "stringers across the deck"))
    .addOption(list("--spacing <ft>", "stringer spacing"))
    .addOption(list("--grade <name>", "steel grade: 36, 50, 50W"))
    .addOption(list("--fy <ksi>", "yield stress instead of a grade"))
    .option("--composite", "the deck acts with the stringers")
    .option("--no-composite", "it does not")
    .addOption(list("--dead <kip/ft>", "all dead load on each stringer but its own steel"))
    .addOption(list("--max-depth <in>", "greatest depth of a shape"));
  addListFlags(command);
  const words: string[] = [];
  const noted = (word: string) => () => {
    words.push(word);
    command.setOptionValue("compositeWords", words);
  };
  return command.on("option:composite", noted("--composite")).on("option:no-composite", noted("--no-composite"));
}

/** Flags that choose among the shapes of a list. */
function addListFlags(command: Command): Command {
  return command
    .addOption(list("--sections <file>", "a list of shapes instead of the catalogue; repeatable; `bundled` adds the catalogue"))
    .addOption(list("--shapes <pattern>", "only shapes of this name, * and ? as wildcards; repeatable"))
    .addOption(list("--without <pattern>", "no shapes of this name; repeatable"));
}

/** Flags of the command that lists shapes. */
export function addSectionFlags(command: Command): Command {
  return addListFlags(command)
    .addOption(list("--min-depth <in>", "least depth"))
    .addOption(list("--max-depth <in>", "greatest depth"))
    .addOption(list("--min-weight <lb/ft>", "least weight"))
    .addOption(list("--max-weight <lb/ft>", "greatest weight"))
    .addOption(list("--fy <ksi>", "least yield stress of the row's own steel; catalogue shapes come to 50"))
    .addOption(new Option("--against <file>", "compare with this list: other figures, only here, only there").argParser(once));
}

/** Flags of the command that reads a list in anybody's columns. */
export function addImportFlags(command: Command): Command {
  return command
    .addOption(new Option("--out <file>", "accepted rows in our columns, to be used with --sections").argParser(once))
    .addOption(new Option("--refused <file>", "refused rows with their lines and reasons").argParser(once))
    .addOption(
      list(
        "--map <name=header>",
        "read NAME from the column HEADER (or #4, the fourth), as depthIn=H; `unread` leaves one aside; repeatable",
      ),
    )
    .addOption(list("--units <units>", "us, metric, or COLUMN=UNIT, such as inertiaXIn4=cm4 or 'Ix=10^6 mm4'; repeatable"))
    .option("--json", "the answer as JSON")
    .option("--force", "replace existing files");
}

/** How the answer is handed over. */
export function addOutputFlags(command: Command): Command {
  return command
    .option("--json", "the answer as JSON")
    .addOption(new Option("--csv <file>", "the answer's rows as CSV, into a file").argParser(once))
    .option("--force", "replace existing files");
}

/** Order by cost. */
export function addPriceFlag(command: Command): Command {
  return command.option("--price", "order by cost of the steel when every passing row has a price");
}

/** How many options are listed. */
export function addTopFlag(command: Command): Command {
  return command.addOption(new Option("--top <n>", "options listed").argParser(wholeNumber).default(5));
}
