import { check } from "../answers/check.js";
import { prepare } from "../answers/question.js";
import { checkRows } from "../report/csv.js";
import { checkJson } from "../report/json.js";
import { checkText } from "../report/text/check.js";
import { firstLine } from "../report/text/frame.js";
import { noLayoutLines } from "../report/text/lightest.js";
import { checkTargets, deliver } from "./deliver.js";
import { gather } from "./gather.js";
import { EXIT, type ExitCode, type Io } from "./io.js";
import type { Flags } from "./options.js";

/** `leanspan check SHAPE`: every number for one shape. */
export async function runCheck(shape: string, flags: Flags, io: Io): Promise<ExitCode> {
  const { question, remarks } = gather(flags, { bridge: "layout", shapes: true, shape });
  await checkTargets(flags);
  for (const remark of remarks) io.stderr(`leanspan: ${remark}\n`);
  const prepared = prepare(question);
  const { bridge, layouts } = prepared;
  const { inTheWay } = layouts;
  const answer = inTheWay.length > 0 ? null : check(prepared, shape);
  await deliver(
    {
      text: () =>
        answer === null
          ? [firstLine(bridge), "", ...noLayoutLines(inTheWay, io.style), ""].join("\n")
          : checkText(bridge, answer, io.style),
      json: () => checkJson(bridge, answer, inTheWay),
      rows: () => (answer === null ? [] : checkRows(answer.assessment)),
    },
    flags,
    io,
  );
  return answer?.assessment.passes === true ? EXIT.found : EXIT.nothing;
}
