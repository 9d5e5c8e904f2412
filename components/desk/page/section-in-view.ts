/**
 * Tells which section of the page stands nearest below the head, as the page is scrolled; empty
 * above the first. Returns a function that stops the telling.
 */
export function sectionInView(page: HTMLElement, tell: (id: string) => void): () => void {
  const look = () => {
    const line = innerHeight * 0.4;
    const above = [...page.querySelectorAll<HTMLElement>('.sections > [id]')].filter(
      (section) => section.getBoundingClientRect().top < line,
    );
    tell(above.at(-1)?.id ?? '');
  };
  addEventListener('scroll', look, { passive: true });
  return () => removeEventListener('scroll', look);
}
