#!/usr/bin/env node
import { styleText } from "node:util";
import { PLAIN, type Style } from "../report/text/frame.js";
import { run } from "./run.js";

const colour = process.stdout.isTTY === true && process.env.NO_COLOR === undefined && process.env.TERM !== "dumb";
const COLOURED: Style = {
  good: (text) => styleText("green", text),
  bad: (text) => styleText("red", text),
  strong: (text) => styleText("bold", text),
};

// A reader that has seen enough, such as head, closes the pipe: that is no error. A full disk is one, and no defect of ours.
process.stdout.on("error", (error: NodeJS.ErrnoException) => {
  if (error.code === "EPIPE") process.exit();
  process.stderr.write(`leanspan: the answer cannot be written: ${error.code === "ENOSPC" ? "the disk is full" : error.message}\n`);
  process.exit(2);
});

process.exitCode = await run(process.argv.slice(2), {
  stdout: (text) => process.stdout.write(text),
  stderr: (text) => process.stderr.write(text),
  colour,
  style: colour ? COLOURED : PLAIN,
});
