import { lightInks, type StackInks } from '../../../scenes/inks.js';

/** The page's custom property of every ink. */
const properties: Record<keyof StackInks, string> = {
  paper: '--paper',
  shade: '--paper-shade',
  ink: '--ink',
  soft: '--soft',
  rule: '--rule',
  current: '--graphite',
  proposed: '--madder',
};

/** The inks an element inherits from the page; the light ones where the page sets none. */
export function inksOf(element: Element): StackInks {
  const style = getComputedStyle(element);
  const entries = Object.entries(properties).map(([name, property]) => {
    const value = style.getPropertyValue(property).trim();
    const isHex = /^#[0-9a-f]{6}$/i.test(value);
    return [name, isHex ? value : lightInks[name as keyof StackInks]];
  });
  return Object.fromEntries(entries) as StackInks;
}
