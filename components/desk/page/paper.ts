/** Light or dark paper, or as the system has it. */
export const papers = ['auto', 'light', 'dark'] as const;
export type Paper = (typeof papers)[number];

const key = 'stratabeam.paper';

/** The paper chosen last in this browser. */
export function keptPaper(): Paper {
  try {
    return papers.find((paper) => paper === localStorage.getItem(key)) ?? 'auto';
  } catch {
    return 'auto';
  }
}

/** Lays the desk on a paper, and keeps the choice where the browser lets it. */
export function usePaper(paper: Paper): void {
  document.documentElement.dataset.paper = paper;
  try {
    localStorage.setItem(key, paper);
  } catch {
    // Storage refused: the choice holds until the page closes.
  }
}
