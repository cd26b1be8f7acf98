import { ionsOf } from "../chemistry/handbook/dissociation.js";
import type { Q, Run as RunFinding } from "../contract/findings.js";
import { problem } from "../contract/problem.js";
import { monitors } from "../monitor/monitors.js";
import { isKind } from "../quantity/kinds.js";
import { noUnit } from "../quantity/unitOf.js";
import type { Follow, Run } from "../study/run.js";
import { cautionsOf } from "./cautions.js";
import { followCurves } from "./curves.js";
import type { EndContext } from "./endPoints.js";
import { fitsOf } from "./fits.js";
import { followDetails } from "./followDetails.js";
import { type Notes, note } from "./notes.js";
import { ratesOf } from "./rates.js";
import { type ReadSignal, readSignal } from "./readSignal.js";
import { lineIn, type RunInput } from "./runInput.js";
import { resultUnits, shown, shownQuantity } from "./shown.js";
import { sourcesOf } from "./sources.js";
import { type Stoichiometry, standardUncertainty, stoichiometry } from "./stoichiometry.js";

/** Everything one run says, as findings. What is wrong with its readings goes into the notes. */
export function analyseRun(run: Run, input: RunInput, notes: Notes): RunFinding {
  const amounts = stoichiometry(run);
  const finding: RunFinding = {
    id: run.id,
    place: input.place(run.origin),
    problems: [],
    name: run.name,
    title: run.title,
    equation: run.reaction?.text ?? "",
    ...(run.reaction === null ? {} : { equationPlace: input.place(run.reaction.origin) }),
    conditions: conditionsOf(run),
    taken: takenOf(run, amounts, input),
    conditionPlaces: conditionPlacesOf(run, input),
    follow: [],
    rates: [],
    fits: [],
    comparisons: [],
    suitability: [],
    cautions: cautionsOf(run, amounts),
  };
  for (const follow of run.follow) {
    const read = input.columns === null ? null : readSignal(run, follow, input.columns, notes);
    const context = read === null ? null : contextOf(run, follow, read, amounts, notes);
    finding.follow.push(followFinding(run, follow, read, context, input));
    const fits = fitsOf(run, follow, context, input, notes);
    const change = fits.find((fit) => fit.change !== null)?.change ?? null;
    finding.fits.push(...fits.map((fit) => fit.finding));
    finding.rates.push(...ratesOf(run, follow, context, change, input, notes));
  }
  // In the order of the text, whichever signal they are of.
  const order = (a: { id: string }, b: { id: string }): number => placeOfId(a.id) - placeOfId(b.id);
  finding.rates.sort(order);
  finding.fits.sort(order);
  return finding;
}

/** The number at the end of an id such as `run A/fit 2`. */
function placeOfId(id: string): number {
  return Number(id.slice(id.lastIndexOf(" ") + 1));
}

function conditionsOf(run: Run): RunFinding["conditions"] {
  const conditions: RunFinding["conditions"] = {};
  if (run.volume !== null) conditions["volume"] = shownQuantity(run.volume.value);
  if (run.temperature !== null) conditions["temperature"] = shownQuantity(run.temperature.value);
  if (run.pressure !== null) conditions["pressure"] = shownQuantity(run.pressure.value);
  if (run.ionicStrength !== null) conditions["ionic strength"] = shownQuantity(run.ionicStrength.value);
  if (run.headSpace !== null) conditions["head space"] = shownQuantity(run.headSpace.value);
  return conditions;
}

function conditionPlacesOf(run: Run, { place }: RunInput): NonNullable<RunFinding["conditionPlaces"]> {
  const facts = {
    volume: run.volume,
    temperature: run.temperature,
    pressure: run.pressure,
    "ionic strength": run.ionicStrength,
    "head space": run.headSpace,
  };
  return Object.fromEntries(
    Object.entries(facts).flatMap(([name, fact]) => (fact === null ? [] : [[name, place(fact.origin)]])),
  );
}

function takenOf(run: Run, amounts: Stoichiometry, { place }: RunInput): RunFinding["taken"] {
  const { concentration } = resultUnits(run, noUnit, noUnit);
  return run.taken.map((taken) => {
    const initial = amounts.initial.get(taken.species.key);
    return {
      species: taken.species.key,
      given: givenOf(taken),
      stock: stockText(taken),
      concentration: initial === undefined ? null : shown(initial.value, standardUncertainty(initial), concentration),
      limiting: amounts.limiting !== null && isOrGives(taken, amounts.limiting),
      place: place(taken.origin),
    };
  });
}

/** Whether what was taken is a species, or gives it in water as an ion. */
function isOrGives({ species, ions }: Run["taken"][number], key: string): boolean {
  if (species.key === key) return true;
  const given = ions?.map((ion) => ion.key) ?? ionsOf(species.formula?.text ?? "")?.map((ion) => ion.key) ?? [];
  return given.includes(key);
}

/** What the line states; a share of the mixture with what it is a share of. */
function givenOf({ given, stock }: Run["taken"][number]): Q {
  const q = shownQuantity(given);
  return isKind(given.unit, "number") && stock?.kind === "share" ? { ...q, text: `${q.text} by ${stock.basis}` } : q;
}

/** `0.5000(50) mol L^-1`, `30 % by mass`. */
function stockText({ given, stock }: Run["taken"][number]): string | null {
  if (stock === null || isKind(given.unit, "number")) return null;
  const { text } = shownQuantity(stock.value);
  return stock.kind === "share" ? `${text} by ${stock.basis}` : text;
}

function contextOf(
  run: Run,
  follow: Follow,
  read: ReadSignal,
  amounts: Stoichiometry,
  notes: Notes,
): EndContext | null {
  const monitor = monitors.get(follow.monitor);
  const number = run.reaction?.numbers.get(follow.species.key) ?? 0;
  if (monitor === undefined) {
    const what = `“${follow.species.key} as ${follow.monitor}”`;
    note(notes, follow.id, problem("not-computed-yet", { what }, lineIn(run, follow)));
    return null;
  }
  // A reaction that is broken, or that does not change the species, has been said to be so on its line.
  if (number === 0) return null;
  const { relation, problems } = monitor.relate(run, follow, read.signal);
  for (const found of problems) note(notes, follow.id, { ...found, origin: lineIn(run, found) });
  return relation === null ? null : { run, follow, signal: read.signal, relation, stoichiometry: amounts };
}

function followFinding(
  run: Run,
  follow: Follow,
  read: ReadSignal | null,
  context: EndContext | null,
  input: RunInput,
): RunFinding["follow"][number] {
  return {
    id: follow.id,
    place: input.place(follow.origin),
    problems: [],
    species: follow.species.key,
    monitor: follow.monitor,
    column: follow.column,
    timeColumn: read?.timeColumn ?? null,
    points: read?.points ?? 0,
    used: context === null ? 0 : context.signal.time.length,
    details: followDetails(run, follow),
    sources: context === null ? [] : sourcesOf(context, input.place),
    ...(input.curves && context !== null && read !== null ? followCurves(context, read, input.place) : {}),
  };
}
