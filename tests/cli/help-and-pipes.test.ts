import { describe, expect, it } from "vitest";
import { leanspan, shell } from "../support/program.js";

const COMMANDS = ["lightest", "counts", "check", "loads", "sections", "init"];

const helpOf = async (command: string) => (await leanspan([command, "--help"])).stdout;

/** The lines under the heading that ends the help. */
const examplesOf = (help: string): string[] =>
  help
    .slice(help.lastIndexOf("Examples:"))
    .split("\n")
    .slice(1)
    .map((line) => line.trim())
    .filter((line) => line !== "");

describe.concurrent("--help", () => {
  // Lost without it: whoever asks how a command is used would have to guess.
  it.each(COMMANDS)("%s: on stdout, exit 0, ends with two examples of the command", async (command) => {
    const { code, stdout, stderr } = await leanspan([command, "--help"]);
    expect([code, stderr]).toEqual([0, ""]);
    expect(stdout).toMatch(new RegExp(`^Usage: leanspan ${command}`));
    const examples = examplesOf(stdout);
    expect(examples).toHaveLength(2);
    for (const example of examples) expect(example.startsWith(`leanspan ${command} `)).toBe(true);
  });

  // Lost without it: the first thing an engineer tries, the line copied from the help, would not run.
  it.each(COMMANDS)("%s: the examples run as they stand, typed into a shell", async (command) => {
    for (const example of examplesOf(await helpOf(command))) {
      const { code, stdout, stderr } = await shell(example);
      expect([0, 1], `${example}\n${stderr}`).toContain(code);
      expect(stdout).not.toBe("");
      expect(stderr).not.toMatch(/fault|error|defect|unexpected/);
    }
  });

  // Lost without it: a newcomer would not find the command that answers the question.
  it("of the program: every command, and two examples that run", async () => {
    const { code, stdout } = await leanspan(["--help"]);
    expect(code).toBe(0);
    for (const command of COMMANDS) expect(stdout).toMatch(new RegExp(`^ +${command} `, "m"));
    const examples = examplesOf(stdout);
    expect(examples).toHaveLength(2);
    for (const example of examples) expect([0, 1]).toContain((await shell(example)).code);
  });

  // Lost without it: an answer in a file could not be traced to the program that gave it.
  it("--version says the version of the package", async () => {
    const { code, stdout } = await leanspan(["--version"]);
    expect(code).toBe(0);
    expect(stdout).toMatch(/^\d+\.\d+\.\d+\n$/);
  });
});

describe.concurrent("a reader that has seen enough", () => {
  // Lost without it: `| head`, the habit of anyone at a shell, would end in a page of stack under the answer.
  it.each([
    "lightest --span 60 --width 33",
    "lightest --span 60 --width 33 --top 50 --json",
    "counts --span 60 --width 33",
    "check W36X160 --span 60 --width 33 --json",
    "loads --span 60",
    "sections --json",
  ])("%s | head -1: one line, nothing on stderr", async (line) => {
    const { stdout, stderr, code } = await shell(`leanspan ${line} | head -1`);
    expect(stderr).toBe("");
    expect(stdout.split("\n")).toHaveLength(2);
    expect(code).toBe(0);
  });

  // Lost without it: a long answer would end in the middle for a program that reads it slowly.
  it("a slow reader gets the whole of a long answer", async () => {
    const { stdout, stderr } = await shell("leanspan lightest --span 60 --width 33 --top 50 --json | (sleep 0.5; cat)");
    expect(stderr).toBe("");
    expect(stdout.length).toBeGreaterThan(200_000);
    expect(JSON.parse(stdout).options).toHaveLength(50);
  });

  // Lost without it: a page of stack would stand in the log of a script that does not care for the answer.
  it("a reader that is not there at all is no defect either", async () => {
    const { stderr } = await shell("leanspan check W36X160 --span 60 --width 33 --json | true");
    expect(stderr).toBe("");
  });
});
