import type { PanelState, Recipe } from '../protocol/panelState';

const sections = (): readonly HTMLDetailsElement[] => [...document.querySelectorAll('details')];

/** Hands on what brings the page back as it is: the recipe, how far it is scrolled, which folded parts are open. */
export function keepPlace(recipe: Recipe, keep: (state: PanelState) => void): void {
  const openSections = sections().flatMap((section, index) => (section.open ? [index] : []));
  keep({ recipe, scroll: window.scrollY, openSections });
}

/** Opens the parts that were open and scrolls to where the person was. */
export function returnToPlace(state: PanelState | null): void {
  if (state === null) return;
  sections().forEach((section, index) => {
    if (state.openSections.includes(index)) section.open = true;
  });
  window.scrollTo(0, state.scroll);
}
