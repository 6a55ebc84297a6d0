import { formula } from "../../formula.js";

/** Factored moment while the deck is poured. Source: AASHTO Standard Specifications, 17th ed., Art. 10.61; the factor is our choice. */
export const pourMoment = formula(
  "Mpour",
  "1.3 * (w1 + wc) * L^2 / 8",
  "kip-ft",
  "10.61",
  ["w1", "wc", "L"],
  (w1: number, wc: number, L: number) => (1.3 * (w1 + wc) * L * L) / 8,
);
