import type { Bridge, Source } from "../bridge/bridge.js";
import type { BrokenLimit } from "../bridge/layouts.js";
import { type Steel, yieldStress } from "../bridge/yield-stress.js";
import type { Stock } from "../catalogue/shape.js";
import type {
  AssessmentRecorder,
  Assessor,
  Check,
  CheckId,
  Effects,
  Line,
  Note,
  Position,
  StringerAssessment,
  StudCount,
} from "../specs/contract.js";
import { LB_PER_KIP } from "../units.js";
import { costPerFtOfBridge } from "./stock.js";

/** A candidate with its checks, as answers show it. */
export interface Assessment {
  readonly shape: string;
  readonly weightPlf: number;
  readonly depthIn: number;
  readonly fyKsi: number;
  /** Who gives the yield stress; "year built" for steel of unknown make. */
  readonly fySource: Source | "year built";
  readonly source: { readonly file: string; readonly line: number };
  readonly layout: { readonly count: number | null; readonly spacingFt: number; readonly overhangFt: number | null };
  readonly brokenLimits: readonly BrokenLimit[];
  readonly steelPlfOfBridge: number | null;
  /** Steel of the whole bridge: pieces over their full length, and miscellaneous steel; null when the count is unknown. */
  readonly steel: {
    readonly mainKip: number;
    readonly miscellaneousKip: number;
    readonly totalKip: number;
    readonly psfOfDeck: number | null;
  } | null;
  /** What the row says of the pieces on hand, and the price of the steel per foot of bridge; null where it says nothing. */
  readonly stock: Stock | null;
  readonly costPerFtOfBridge: number | null;
  readonly passes: boolean;
  readonly governing: { readonly id: CheckId; readonly position: Position; readonly ratio: number };
  readonly stringers: readonly StringerAssessment[];
}

/** Assesses a candidate with everything written down; the figures are those of the search, for the same code makes them. */
export function assessInFull(bridge: Bridge, assessor: Assessor, steel: Steel): Assessment {
  const recording = new Recording();
  assessor.assess(steel, recording);
  const slot = assessor.slots[assessor.governingSlot];
  const { layout } = assessor;
  const { shape, fyKsi } = steel;
  const yieldFrom = yieldStress(bridge, shape);
  return {
    shape: shape.designation,
    weightPlf: shape.weightPlf,
    depthIn: shape.depthIn,
    fyKsi,
    fySource: "issue" in yieldFrom ? "bridge" : yieldFrom.source,
    source: shape.source,
    layout: { count: layout.count, spacingFt: layout.spacingFt, overhangFt: layout.overhangFt },
    brokenLimits: layout.broken,
    steelPlfOfBridge: layout.count === null ? null : layout.count * shape.weightPlf,
    steel: layout.count === null ? null : steelOf(bridge, layout.count, shape.weightPlf),
    stock: shape.stock,
    costPerFtOfBridge: costPerFtOfBridge(steel, layout.count),
    passes: assessor.passes,
    governing: { id: slot.id, position: slot.position, ratio: assessor.governingRatio },
    stringers: recording.stringers(),
  };
}

function steelOf(bridge: Bridge, count: number, weightPlf: number): NonNullable<Assessment["steel"]> {
  const pieceFt = bridge.spanFt + 2 * bridge.pieceOverlapFt;
  const mainKip = (count * weightPlf * pieceFt) / LB_PER_KIP;
  const miscellaneousKip = mainKip * bridge.steel.miscFraction;
  const totalKip = mainKip + miscellaneousKip;
  const width = bridge.deck.outToOutFt;
  return { mainKip, miscellaneousKip, totalKip, psfOfDeck: width === null ? null : (totalKip * LB_PER_KIP) / (pieceFt * width) };
}

interface Draft {
  readonly position: Position;
  readonly checks: Check[];
  readonly notes: Note[];
  readonly lines: Line[];
  effects: Effects | null;
  support: StringerAssessment["support"] | null;
  studs: StudCount | null;
}

class Recording implements AssessmentRecorder {
  readonly #drafts: Draft[] = [];

  get #draft(): Draft {
    const draft = this.#drafts.at(-1);
    if (draft === undefined) throw new RangeError("a step before any stringer");
    return draft;
  }

  stringer(position: Position): void {
    this.#drafts.push({ position, checks: [], notes: [], lines: [], effects: null, support: null, studs: null });
  }
  topic(topic: Parameters<AssessmentRecorder["topic"]>[0]): void {
    this.#draft.lines.push({ type: "topic", topic });
  }
  step: AssessmentRecorder["step"] = (formula, result, ...numbers) => {
    this.#draft.lines.push({ type: "step", formula: formula as never, numbers, result });
  };
  value(symbol: string, value: number, unit: string, from: string): void {
    this.#draft.lines.push({ type: "value", symbol, value, unit, from });
  }
  check(check: Check): void {
    this.#draft.checks.push(check);
    this.#draft.lines.push({ type: "check", check });
  }
  effects(effects: Effects): void {
    this.#draft.effects = effects;
  }
  note(code: string, ...args: readonly (number | string)[]): void {
    this.#draft.notes.push({ code, args });
  }
  support(article: string, shearKip: number, withoutStiffenersKip: number, bearingLengthNeededIn: number): void {
    this.#draft.support = {
      article,
      shearKip,
      withoutStiffenersKip,
      bearingLengthNeededIn,
      stiffenersNeeded: !(shearKip <= withoutStiffenersKip),
    };
  }
  studs(article: string, forceKip: number, strengthKip: number, perHalfSpan: number, perRow: number): void {
    const whole = Math.ceil(perHalfSpan / perRow - 1e-9) * perRow;
    this.#draft.studs = { article, forceKip, strengthKip, perHalfSpan: whole, perStringer: 2 * whole };
  }

  stringers(): readonly StringerAssessment[] {
    return this.#drafts.map(({ position, effects, support, studs, checks, notes, lines }) => {
      if (effects === null || support === null) throw new RangeError(`the ${position} stringer was not finished`);
      return { position, effects, checks, support, studs, notes, lines };
    });
  }
}
