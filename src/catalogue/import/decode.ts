import { InputError } from "../../errors.js";

/** A list's bytes in pieces; opened anew for each pass over the file. */
export type OpenBytes = () => AsyncIterable<Uint8Array> | Iterable<Uint8Array>;

/** Ways in which a list's text may be written down. */
export type Encoding = "utf-8" | "utf-16le" | "utf-16be" | "windows-1252";

/** What the first pass over the bytes found. */
export interface EncodingFound {
  readonly encoding: Encoding;
  /** Whether the bytes end in the middle of a character: the file was cut off. */
  readonly cutShort: boolean;
}

/** Bytes looked at for signs of UTF-16 without a mark. */
const HEAD_BYTES = 4096;
// biome-ignore lint/suspicious/noControlCharactersInRegex: control characters are what is looked for
const NO_TEXT = /[\u0000-\u0008\u000e-\u0019\u001b-\u001f\u007f-\u009f]/;

/**
 * Finds the encoding of a list: by its byte-order mark, by the zeros of UTF-16, by being sound UTF-8; else Windows-1252.
 *
 * @param open the file's bytes
 * @param file its name, for the faults
 * @throws {InputError} where the file is empty or holds what is no text (NUL and control characters), with line and column
 */
export async function findEncoding(open: OpenBytes, file: string): Promise<EncodingFound> {
  const head = await headOf(open);
  if (head.length === 0) throw new InputError([{ file, problem: "the file is empty", allowed: "a list of shapes as CSV text" }]);
  const marked = markOf(head) ?? unmarkedUtf16(head);
  if (marked !== null) return { encoding: marked, cutShort: await demandText(open, marked, file) };
  try {
    return { encoding: "utf-8", cutShort: await demandText(open, "utf-8", file) };
  } catch (error) {
    if (!(error instanceof TypeError)) throw error;
    return { encoding: "windows-1252", cutShort: await demandText(open, "windows-1252", file) };
  }
}

/**
 * The text of a list, piece by piece, without its byte-order mark.
 *
 * @param encoding as `findEncoding` found it
 */
export async function* decode(open: OpenBytes, { encoding }: EncodingFound): AsyncGenerator<string> {
  const decoder = new TextDecoder(encoding);
  for await (const chunk of open()) {
    const text = decoder.decode(chunk, { stream: true });
    // Old programs close a text file with a substitute character.
    if (text !== "") yield text.replaceAll("\u001a", "");
  }
  const last = decoder.decode();
  // A character cut off at the end of the file is left out: the row it stands in is refused as cut off.
  if (last !== "" && last !== "\uFFFD") yield last;
}

async function headOf(open: OpenBytes): Promise<Uint8Array> {
  let head = new Uint8Array(0);
  for await (const chunk of open()) {
    const joined = new Uint8Array(head.length + chunk.length);
    joined.set(head);
    joined.set(chunk, head.length);
    head = joined;
    if (head.length >= HEAD_BYTES) break;
  }
  return head.subarray(0, HEAD_BYTES);
}

function markOf(head: Uint8Array): Encoding | null {
  const [first, second, third] = head;
  if (first === 0xff && second === 0xfe) return "utf-16le";
  if (first === 0xfe && second === 0xff) return "utf-16be";
  return first === 0xef && second === 0xbb && third === 0xbf ? "utf-8" : null;
}

/** Text of Latin letters in UTF-16 has a zero in every second byte, and only there. */
function unmarkedUtf16(head: Uint8Array): Encoding | null {
  const zeros = [0, 0];
  head.forEach((byte, at) => {
    if (byte === 0) zeros[at % 2]++;
  });
  const many = 0.35 * head.length;
  if (zeros[1] > many && zeros[0] === 0) return "utf-16le";
  return zeros[0] > many && zeros[1] === 0 ? "utf-16be" : null;
}

/**
 * Reads the whole file once and makes sure it is text.
 *
 * @returns whether it ends in the middle of a character
 * @throws {TypeError} where the bytes are not of this encoding
 * @throws {InputError} at the first character that no text holds
 */
async function demandText(open: OpenBytes, encoding: Encoding, file: string): Promise<boolean> {
  const decoder = new TextDecoder(encoding, { fatal: encoding === "utf-8" });
  let line = 1;
  let column = 1;
  let afterReturn = false;
  for await (const chunk of open()) {
    const text = decoder.decode(chunk, { stream: true });
    const found = NO_TEXT.exec(text);
    for (let at = 0; at < (found?.index ?? text.length); at++) {
      const code = text.charCodeAt(at);
      if (code === 13 || (code === 10 && !afterReturn)) line++;
      column = code === 10 || code === 13 ? 1 : column + 1;
      afterReturn = code === 13;
    }
    if (found !== null) {
      const code = found[0].charCodeAt(0);
      const what = code === 0 ? "a NUL byte" : `a control character (code ${code})`;
      throw new InputError([
        {
          file,
          line,
          problem: `column ${column}: ${what}; this is binary data or a damaged file`,
          allowed: "a list of shapes as CSV text",
        },
      ]);
    }
  }
  try {
    return decoder.decode() !== "";
  } catch (error) {
    // Sound until a last character that breaks off.
    if (error instanceof TypeError) return true;
    throw error;
  }
}
