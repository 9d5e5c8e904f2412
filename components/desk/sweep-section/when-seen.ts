import type { LitElement, ReactiveController } from 'lit';

/** Knows whether an element is on the screen, or nearly: what nobody looks at need not be computed. */
export class WhenSeen implements ReactiveController {
  isSeen = false;
  private observer: IntersectionObserver | null = null;

  constructor(private readonly host: LitElement) {
    host.addController(this);
  }

  hostConnected(): void {
    this.observer = new IntersectionObserver(
      (entries) => {
        const isSeen = entries.some(({ isIntersecting }) => isIntersecting);
        if (isSeen === this.isSeen) return;
        this.isSeen = isSeen;
        this.host.requestUpdate();
      },
      { rootMargin: '150px' },
    );
    this.observer.observe(this.host);
  }

  hostDisconnected(): void {
    this.observer?.disconnect();
    this.isSeen = false;
  }
}
