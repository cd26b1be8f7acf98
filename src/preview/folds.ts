/** Which parts are open: what a person opened or folded stays so, over every change of the page and over reloads. */
export interface Folds {
  readonly known: () => Readonly<Record<string, boolean>>;
  /** Puts the parts of a page that is about to be shown as the person left them. */
  apply(page: ParentNode): void;
}

export function createFolds(page: HTMLElement, before: Readonly<Record<string, boolean>>, changed: () => void): Folds {
  const states = new Map(Object.entries(before));
  // “toggle” does not bubble; it is heard on its way down.
  page.addEventListener(
    "toggle",
    ({ target }) => {
      if (!(target instanceof HTMLDetailsElement)) return;
      const name = target.dataset["part"];
      if (name === undefined || states.get(name) === target.open) return;
      states.set(name, target.open);
      changed();
    },
    true,
  );
  return {
    known: () => Object.fromEntries(states),
    apply(parts) {
      for (const part of parts.querySelectorAll<HTMLDetailsElement>("details[data-part]")) {
        const open = states.get(part.dataset["part"] ?? "");
        if (open !== undefined) part.open = open;
      }
    },
  };
}
