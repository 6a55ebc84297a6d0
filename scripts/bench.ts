// Speed of the search, in one run: `npm run bench` after a build. Never a test: the figures are ratios and rates of one machine on one day.
//
// 1. Wall time of the built command on the default question as a ratio to an empty Node process, median of 20.
// 2. Full assessments a second on one core: both positions, every check, no early exit, all shapes on all layouts, with a checksum of the
//    ratios so that nothing can be optimised away; then the same question as the ranker asks it, which stops once the answer is settled.
// 3. Peak memory of the command.
import { spawnSync } from "node:child_process";
import { readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { ask, prepare } from "../src/answers/question.js";
import { flagLayer, readLayer } from "../src/bridge/layers.js";
import { readShapes } from "../src/catalogue/read-shapes.js";
import { readVehicles } from "../src/loads/vehicles.js";
import { rank } from "../src/ranking/rank.js";
import { ABSENT } from "../src/specs/contract.js";

const RUNS = 20;
const ROUNDS = 40;
const file = (path: string): string => fileURLToPath(new URL(`../${path}`, import.meta.url));
const text = (path: string): string => readFileSync(file(path), "utf8");

function median(values: number[]): number {
  return values.sort((a, b) => a - b)[Math.floor(values.length / 2)];
}

function wallMs(args: readonly string[]): number {
  const start = performance.now();
  const { status } = spawnSync(process.execPath, args, { stdio: "ignore" });
  if (status !== 0) throw new Error(`node ${args.join(" ")} ended with ${status}`);
  return performance.now() - start;
}

function startRatio(): void {
  const command = [file("dist/cli/main.js"), "lightest", "--span", "60", "--width", "33"];
  wallMs(command);
  const empty: number[] = [];
  const whole: number[] = [];
  for (let run = 0; run < RUNS; run++) {
    empty.push(wallMs(["-e", "0"]));
    whole.push(wallMs(command));
  }
  const [base, ours] = [median(empty), median(whole)];
  console.log(
    `lightest --span 60 --width 33: ${(ours / base).toFixed(2)} times an empty process (${ours.toFixed(0)} ms to ${base.toFixed(0)} ms)`,
  );
}

function question(specification: string) {
  const vehicles = readVehicles(text("data/vehicles.json"), "vehicles.json", []);
  const layers = [
    readLayer(text("data/practice.json"), "practice.json", "practice"),
    flagLayer([
      { flag: "--span", key: "spanFt", text: "60" },
      { flag: "--width", key: "deck.outToOutFt", text: "33" },
      { flag: "--spec", key: "specification", text: specification },
      { flag: "--composite", key: "deck.composite", text: String(specification === "lrfd") },
    ]),
  ];
  const { shapes } = readShapes(text("data/w-shapes.csv"), "w-shapes.csv", { bundled: true });
  return prepare(ask(layers, "layout", shapes, vehicles));
}

function assessmentRate(specification: string, name: string): void {
  const { space } = question(specification);
  const pass = (): { assessed: number; checksum: number } => {
    let assessed = 0;
    let checksum = 0;
    for (const assessor of space.assessors) {
      for (const steel of space.steels) {
        assessor.assess(steel, null);
        for (const ratio of assessor.ratios) if (ratio !== ABSENT) checksum += ratio;
        assessed++;
      }
    }
    return { assessed, checksum };
  };
  const { checksum } = pass();
  const start = performance.now();
  let assessed = 0;
  for (let round = 0; round < ROUNDS; round++) assessed += pass().assessed;
  const seconds = (performance.now() - start) / 1000;
  console.log(
    `${name}: full assessments: ${Math.round(assessed / seconds)} a second on one core (checksum of ratios ${checksum.toFixed(6)})`,
  );
  const began = performance.now();
  for (let round = 0; round < ROUNDS; round++) rank(space, 5);
  const ranked = (performance.now() - began) / 1000;
  console.log(
    `${name}: the ranker's question: ${Math.round(assessed / ranked)} candidates settled a second, ${(seconds / ranked).toFixed(2)} times the full search`,
  );
}

function peakMemory(): void {
  const probe = 'process.on("exit", () => process.stderr.write(String(process.resourceUsage().maxRSS / 1024)));';
  const { stderr } = spawnSync(
    process.execPath,
    [
      "--import",
      `data:text/javascript,${encodeURIComponent(probe)}`,
      file("dist/cli/main.js"),
      "lightest",
      "--span",
      "60",
      "--width",
      "33",
    ],
    { encoding: "utf8", stdio: ["ignore", "ignore", "pipe"] },
  );
  console.log(`peak memory: ${Number(stderr).toFixed(0)} MB`);
}

startRatio();
assessmentRate("lfd", "lfd noncomposite");
assessmentRate("lrfd", "lrfd composite");
peakMemory();
