import type { Dimension } from "../quantity/dimension.js";

/** What a quantity of a line may be: dimensions in order of liking, how it is called in messages, and its sign. */
export interface KindOfQuantity {
  /** begins the sentence "… needs a unit of …" */
  readonly name: string;
  /** null: decided later, by what the line belongs to */
  readonly dimensions: readonly Dimension[] | null;
  /** refused where the value, in SI, is below it */
  readonly atLeast?: "zero" | "above zero";
}

const time: Dimension = [0, 0, 1, 0, 0, 0, 0];
const volume: Dimension = [3, 0, 0, 0, 0, 0, 0];
const temperature: Dimension = [0, 0, 0, 0, 1, 0, 0];
const concentration: Dimension = [-3, 0, 0, 0, 0, 1, 0];
const amount: Dimension = [0, 0, 0, 0, 0, 1, 0];
const mass: Dimension = [0, 1, 0, 0, 0, 0, 0];

export const quantityKinds = {
  time: { name: "Time", dimensions: [time] },
  volume: { name: "Volume", dimensions: [volume], atLeast: "above zero" },
  temperature: { name: "Temperature", dimensions: [temperature], atLeast: "zero" },
  taken: { name: "What was taken", dimensions: [concentration, amount, mass], atLeast: "zero" },
  reading: { name: "The reading", dimensions: null },
  uncertainty: { name: "The uncertainty", dimensions: null, atLeast: "zero" },
} as const satisfies Record<string, KindOfQuantity>;

export type QuantityKind = keyof typeof quantityKinds;
