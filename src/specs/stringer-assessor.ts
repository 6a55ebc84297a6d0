import type { Bridge } from "../bridge/bridge.js";
import { nextLaneStepFt } from "../bridge/lanes.js";
import type { Layout } from "../bridge/layouts.js";
import type { Steel } from "../bridge/yield-stress.js";
import type { Shape } from "../catalogue/shape.js";
import { requireFinite } from "../errors.js";
import { formula } from "../formula.js";
import { ABSENT, type AssessmentRecorder, type Assessor, type CheckId, type CheckKind, type Design, type Position } from "./contract.js";

/** Roadways less than this below the next lane count are pointed out, ft. Source: common practice. */
const LANE_STEP_MARGIN_FT = 2;
/** Overhang beyond which the pour's brackets twist the fascia stringer noticeably. Source: common practice. */
const greatestOverhang = formula("omax", "min(3, 1.3 * d / 12)", "ft", "common practice", ["d"], (d: number) =>
  Math.min(3, (1.3 * d) / 12),
);
/** Places of the checks of one stringer, in the order in which they are shown; no specification uses all of them. */
const SLOTS = [
  "flexure",
  "flange-slenderness",
  "web-slenderness",
  "slenderness-interaction",
  "bracing",
  "diaphragm-spacing",
  "ductility",
  "shear",
  "overload",
  "service-ii",
  "live-load-deflection",
  "fatigue",
  "deck-pour",
  "proportions",
  "depth",
  "handling",
  "overhang",
  "layout",
  "lane-step",
  "deck-thickness",
  "distribution-sum",
] as const;
export type Slot = (typeof SLOTS)[number];
const PLACE = Object.fromEntries(SLOTS.map((slot, place) => [slot, place])) as Readonly<Record<Slot, number>>;

const KIND: Readonly<Record<Slot, CheckKind>> = {
  flexure: "demand",
  "flange-slenderness": "limit",
  "web-slenderness": "limit",
  "slenderness-interaction": "limit",
  bracing: "limit",
  "diaphragm-spacing": "advisory",
  ductility: "limit",
  shear: "demand",
  overload: "demand",
  "service-ii": "demand",
  "live-load-deflection": "demand",
  fatigue: "demand",
  "deck-pour": "demand",
  proportions: "limit",
  depth: "advisory",
  handling: "advisory",
  overhang: "advisory",
  layout: "advisory",
  "lane-step": "advisory",
  "deck-thickness": "advisory",
  "distribution-sum": "advisory",
};

/**
 * What every specification's assessor shares: the table of ratios, the kinds that the bridge's own settings give the checks, the run over
 * the stringers and the verdict.
 */
export abstract class StringerAssessor implements Assessor {
  readonly layout: Layout;
  readonly positions: readonly Position[];
  readonly ratios: Float64Array;
  readonly slots: readonly { readonly position: Position; readonly id: CheckId; readonly kind: CheckKind }[];
  passes = false;
  governingRatio = Number.POSITIVE_INFINITY;
  governingSlot = 0;
  /** Whether advisories may be left out: the run is a screening and none of them is enforced. */
  protected advisoriesOff = false;
  /** Whether a screening has met a failing required check. */
  protected settled = false;

  readonly #kinds: readonly CheckKind[];
  readonly #used: readonly boolean[];
  readonly #advisoriesRequired: boolean;
  #screening = false;

  /** @throws {RangeError} if a number of bridge, live load or layout is not finite */
  constructor(design: Design, layout: Layout) {
    const { bridge } = design;
    requireSound(design);
    requireFinite("layout", layout);
    this.layout = layout;
    this.positions = positionsOf(layout.count);
    const uses = {
      "live-load-deflection": { use: bridge.deflection.use, enforced: "demand" },
      depth: { use: bridge.advisories.depth, enforced: "limit" },
      handling: { use: bridge.advisories.handling, enforced: "limit" },
      overhang: { use: bridge.advisories.overhang, enforced: "limit" },
    } as const;
    const chosen = (slot: Slot) => (slot in uses ? uses[slot as keyof typeof uses] : null);
    this.#kinds = SLOTS.map((slot) => {
      const own = chosen(slot);
      return own === null ? KIND[slot] : own.use === "enforce" ? own.enforced : "advisory";
    });
    this.#used = SLOTS.map((slot) => chosen(slot)?.use !== "off");
    this.#advisoriesRequired = Object.values(bridge.advisories).includes("enforce");
    this.ratios = new Float64Array(this.positions.length * SLOTS.length).fill(ABSENT);
    this.slots = this.positions.flatMap((position) => SLOTS.map((slot, place) => ({ position, id: slot, kind: this.#kinds[place] })));
  }

  assess(steel: Steel, recorder: AssessmentRecorder | null): void {
    this.#screening = false;
    this.#run(steel, recorder);
  }

  screen(steel: Steel): boolean {
    this.#screening = true;
    this.#run(steel, null);
    return this.passes;
  }

  /**
   * Assesses one stringer, handing each check to `check`; may return once `settled`.
   *
   * @param index place of the stringer in `positions`
   */
  protected abstract assessStringer(index: number, steel: Steel, recorder: AssessmentRecorder | null): void;

  /** Takes one check: its ratio into the table, and the whole of it to the recorder. */
  protected check(
    index: number,
    slot: Slot,
    demand: number,
    capacity: number,
    unit: string,
    article: string,
    recorder: AssessmentRecorder | null,
  ): void {
    const place = PLACE[slot];
    if (!this.#used[place]) return;
    // A capacity that is nothing or less carries no load at all: a ratio below zero would read as one that fits.
    const ratio = capacity > 0 ? demand / capacity : Number.POSITIVE_INFINITY;
    this.ratios[index * SLOTS.length + place] = ratio;
    const kind = this.#kinds[place];
    if (this.#screening && !(ratio <= 1) && kind !== "advisory") this.settled = true;
    recorder?.check({ id: slot, kind, article, demand, capacity, unit, ratio, ok: ratio <= 1 });
  }

  /** Advisories on the layout, the same in every specification: overhang, limits of the practice, a lane nearly gained. */
  protected adviseLayout(index: number, bridge: Bridge, shape: Shape, recorder: AssessmentRecorder | null): void {
    const { overhangFt, broken } = this.layout;
    if (this.positions[index] === "exterior" && overhangFt !== null) {
      const omax = greatestOverhang.of(shape.depthIn);
      recorder?.step(greatestOverhang, omax, shape.depthIn);
      this.check(index, "overhang", overhangFt, omax, "ft", "common practice", recorder);
    }
    for (const { key, value, limit } of broken) {
      const [required, provided] = value > limit ? [value, limit] : [limit, value];
      this.check(index, "layout", required, provided, key.endsWith("Ft") ? "ft" : "-", `practice ${key}`, recorder);
    }
    if (bridge.roadwayFt !== null && bridge.sources["liveLoad.lanes"] === "practice") {
      const gap = nextLaneStepFt(bridge.roadwayFt) - bridge.roadwayFt;
      this.check(index, "lane-step", LANE_STEP_MARGIN_FT, gap, "ft", bridge.specification === "lfd" ? "3.6" : "3.6.1.1.1", recorder);
    }
  }

  #run(steel: Steel, recorder: AssessmentRecorder | null): void {
    this.ratios.fill(ABSENT);
    this.settled = false;
    this.advisoriesOff = this.#screening && !this.#advisoriesRequired;
    for (let index = 0; index < this.positions.length && !this.settled; index++) this.assessStringer(index, steel, recorder);
    this.#decide();
    if (!soundFigures(steel)) {
      this.passes = false;
      this.governingRatio = Number.POSITIVE_INFINITY;
    }
  }

  /** The worst failing required check, else the worst required demand; what is not a number fails as infinity. */
  #decide(): void {
    let failing = -1;
    let failingRatio = 0;
    let worst = -1;
    let worstRatio = -1;
    for (let place = 0; place < this.ratios.length; place++) {
      const kind = this.#kinds[place % SLOTS.length];
      const ratio = this.ratios[place];
      if (kind === "advisory" || ratio === ABSENT) continue;
      if (!(ratio <= 1)) {
        const fails = ratio > 1 ? ratio : Number.POSITIVE_INFINITY;
        if (fails > failingRatio) {
          failing = place;
          failingRatio = fails;
        }
      } else if (kind === "demand" && ratio > worstRatio) {
        worst = place;
        worstRatio = ratio;
      }
    }
    this.passes = failing < 0 && worst >= 0;
    this.governingSlot = failing >= 0 ? failing : worst;
    this.governingRatio = failing >= 0 ? failingRatio : worstRatio;
  }
}

/** Designs whose numbers were found finite: each is looked through once, not once a layout. */
const sound = new WeakSet<Design>();

function requireSound(design: Design): void {
  if (sound.has(design)) return;
  requireFinite("bridge", design.bridge);
  requireFinite("vehicle", design.vehicle);
  requireFinite("live load", design.live);
  sound.add(design);
}

/** Whether every figure of a shape is finite: what is not makes the sum of all NaN or infinite. */
function soundFigures({ shape, fyKsi }: Steel): boolean {
  const sum =
    fyKsi +
    shape.weightPlf +
    shape.areaIn2 +
    shape.depthIn +
    shape.flangeWidthIn +
    shape.webThicknessIn +
    shape.flangeThicknessIn +
    shape.kDesignIn +
    shape.inertiaXIn4 +
    shape.sectionModulusXIn3 +
    shape.radiusXIn +
    shape.plasticModulusXIn3 +
    shape.inertiaYIn4 +
    shape.sectionModulusYIn3 +
    shape.radiusYIn +
    shape.plasticModulusYIn3 +
    shape.torsionJIn4 +
    shape.warpingCwIn6 +
    shape.flangeSlenderness +
    shape.webSlenderness;
  return Math.abs(sum) < Number.POSITIVE_INFINITY;
}

/** Two stringers are both exterior; of an unknown number one interior stringer is asked for. */
function positionsOf(count: number | null): readonly Position[] {
  if (count === null) return ["interior"];
  return count === 2 ? ["exterior"] : ["interior", "exterior"];
}
