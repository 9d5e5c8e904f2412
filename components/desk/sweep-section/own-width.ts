import type { LitElement, ReactiveController } from 'lit';

/** The width that a place inside an element has, so that charts are drawn to it and never scaled. */
export class OwnWidth implements ReactiveController {
  width: number;
  private observer: ResizeObserver | null = null;
  private watched: Element | null = null;

  /** @param usual the width until the place has been measured. */
  constructor(
    private readonly host: LitElement,
    private readonly selector: string,
    usual: number,
  ) {
    this.width = usual;
    host.addController(this);
  }

  hostConnected(): void {
    this.observer = new ResizeObserver(([entry]) => {
      const width = Math.round(entry.contentRect.width);
      if (width <= 0 || width === this.width) return;
      this.width = width;
      this.host.requestUpdate();
    });
  }

  hostUpdated(): void {
    const place = this.host.renderRoot.querySelector(this.selector);
    if (place === this.watched) return;
    if (this.watched) this.observer?.unobserve(this.watched);
    if (place) this.observer?.observe(place);
    this.watched = place;
  }

  hostDisconnected(): void {
    this.observer?.disconnect();
    this.watched = null;
  }
}
