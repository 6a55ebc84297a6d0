import { counts } from "../answers/counts.js";
import { prepare } from "../answers/question.js";
import { countRows } from "../report/csv.js";
import { countsJson } from "../report/json.js";
import { countsText } from "../report/text/counts.js";
import { checkTargets, deliver } from "./deliver.js";
import { gather } from "./gather.js";
import { EXIT, type ExitCode, type Io } from "./io.js";
import type { Flags } from "./options.js";

/** `leanspan counts`: how many stringers across the deck. */
export async function runCounts(flags: Flags, io: Io): Promise<ExitCode> {
  const { question, remarks } = gather(flags, { bridge: "width", shapes: true });
  await checkTargets(flags);
  for (const remark of remarks) io.stderr(`leanspan: ${remark}\n`);
  const prepared = prepare(question);
  const { bridge, layouts } = prepared;
  const answer = counts(prepared);
  await deliver(
    {
      text: () => countsText(bridge, answer, layouts.inTheWay, io.style),
      json: () => countsJson(bridge, answer, layouts.inTheWay),
      rows: () => countRows(answer),
    },
    flags,
    io,
  );
  return answer.lightestCount === null ? EXIT.nothing : EXIT.found;
}
