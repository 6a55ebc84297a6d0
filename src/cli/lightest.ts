import { lightest } from "../answers/lightest.js";
import { prepare } from "../answers/question.js";
import { lightestRows } from "../report/csv.js";
import { lightestJson } from "../report/json.js";
import { lightestText } from "../report/text/lightest.js";
import { checkTargets, deliver } from "./deliver.js";
import { gather } from "./gather.js";
import { EXIT, type ExitCode, type Io } from "./io.js";
import type { Flags } from "./options.js";

/** `leanspan lightest`: the lightest options that pass. */
export async function runLightest(flags: Flags, io: Io): Promise<ExitCode> {
  const { question, remarks } = gather(flags, { bridge: "layout", shapes: true });
  await checkTargets(flags);
  for (const remark of remarks) io.stderr(`leanspan: ${remark}\n`);
  const prepared = prepare(question);
  const { bridge, layouts } = prepared;
  const answer = lightest(prepared, flags.top ?? 5, flags.price === true ? "cost" : "weight");
  await deliver(
    {
      text: () => lightestText(bridge, answer, layouts.inTheWay, io.style),
      json: () => lightestJson(bridge, answer, layouts.inTheWay),
      rows: () => lightestRows(answer),
    },
    flags,
    io,
  );
  return answer.options.length > 0 ? EXIT.found : EXIT.nothing;
}
