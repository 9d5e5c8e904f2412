import { lightInks, type StackInks } from '../../../scenes/inks.js';

/** The inks of the page an element stands on, from its custom properties. */
export function pageInks(element: Element): StackInks {
  const style = getComputedStyle(element);
  const read = (name: string, otherwise: string) =>
    style.getPropertyValue(name).trim() || otherwise;
  return {
    paper: read('--paper', lightInks.paper),
    shade: read('--paper-shade', lightInks.shade),
    ink: read('--ink', lightInks.ink),
    soft: read('--soft', lightInks.soft),
    rule: read('--entry-rule', lightInks.rule),
    current: read('--graphite', lightInks.current),
    proposed: read('--madder', lightInks.proposed),
  };
}

/** Calls back when the paper changes, by the system or by choice; returns what stops it. */
export function onPaperChange(changed: () => void): () => void {
  const system = matchMedia('(prefers-color-scheme: dark)');
  const chosen = new MutationObserver(changed);
  system.addEventListener('change', changed);
  chosen.observe(document.documentElement, { attributeFilter: ['data-paper'] });
  return () => {
    system.removeEventListener('change', changed);
    chosen.disconnect();
  };
}
