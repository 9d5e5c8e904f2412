import type { ReactiveController, ReactiveControllerHost } from 'lit';
import type { StackInks } from '../../../scenes/inks.js';
import type { StackLayout } from '../../../scenes/stack-layout.js';
import type { StackScene } from '../../../scenes/stack-scene-data.js';
import { sectionView, type View } from '../../../scenes/view.js';
import { onPaperChange } from './page-inks.js';
import { type HostedPicture, hostPicture } from './picture-host.js';

/**
 * Keeps a 3D picture in an element while it is on the page: made after the first paint, made again
 * after the graphics card dropped it, freed when the element leaves. Remembers what to draw, so that
 * it can be told before the picture is there.
 */
export class PictureController implements ReactiveController {
  private hosted: HostedPicture | null = null;
  private listening: AbortController | null = null;
  private scene: StackScene | null = null;
  private layout: StackLayout | null = null;
  private view: View = sectionView;

  constructor(
    private readonly host: ReactiveControllerHost & Element,
    /** The element the canvas goes into, there after the first update. */
    private readonly place: () => HTMLElement | null,
    private readonly inks: () => StackInks,
  ) {
    host.addController(this);
  }

  /** True while the 3D picture is there; otherwise a flat section has to stand in. */
  isSolid = false;

  get frames(): number {
    return this.hosted?.picture.frames() ?? 0;
  }

  hostUpdated(): void {
    if (this.listening || !this.host.isConnected) return;
    this.listening = new AbortController();
    const { signal } = this.listening;
    signal.addEventListener(
      'abort',
      onPaperChange(() => this.ink()),
    );
    void this.begin(signal);
  }

  hostConnected(): void {
    this.host.requestUpdate();
  }

  hostDisconnected(): void {
    this.listening?.abort();
    this.listening = null;
    this.end();
  }

  show(scene: StackScene, layout: StackLayout): void {
    this.scene = scene;
    this.layout = layout;
    this.hosted?.picture.show(scene, layout);
  }

  look(view: View): void {
    this.view = view;
    this.hosted?.picture.look(view);
  }

  ink(): void {
    this.hosted?.picture.ink(this.inks());
  }

  private async begin(signal: AbortSignal): Promise<void> {
    const place = this.place();
    if (!place) return;
    const hosted = await hostPicture(place, this.inks(), (happened) => {
      if (happened === 'lost') this.setSolid(false);
      else {
        this.end();
        void this.begin(signal);
      }
    });
    if (signal.aborted) hosted?.remove();
    else if (hosted) {
      this.hosted = hosted;
      if (this.scene && this.layout) hosted.picture.show(this.scene, this.layout);
      hosted.picture.look(this.view);
      this.setSolid(true);
    }
  }

  private end(): void {
    this.hosted?.remove();
    this.hosted = null;
    this.setSolid(false);
  }

  private setSolid(isSolid: boolean): void {
    this.isSolid = isSolid;
    this.host.requestUpdate();
  }
}
