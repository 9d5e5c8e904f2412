import type { ReactiveController, ReactiveControllerHost } from 'lit';
import {
  isSectionView,
  sectionView,
  type View,
  viewBetween,
  viewWords,
} from '../../../scenes/view.js';
import type { PresetName } from '../../../scenes/view-presets.js';

const moves_ms = 260;
const announced_ms = 350;

const isCalm = () => matchMedia('(prefers-reduced-motion: reduce)').matches;

/** From where an element looks at the stack: named views are gone to in a short movement. */
export class ViewController implements ReactiveController {
  view: View = sectionView;
  /** The named view looked from; null once it has been turned by hand. */
  preset: PresetName | null = 'section';
  /** The view in words, a moment after it has come to rest; empty until something moved. */
  announced = '';
  private move = 0;
  private pause: ReturnType<typeof setTimeout> | undefined;

  constructor(
    private readonly host: ReactiveControllerHost,
    /** Told every view, and whether labels beside the section stopped or began to fit it. */
    private readonly looked: (view: View, isSection: boolean, isNews: boolean) => void,
  ) {
    host.addController(this);
  }

  hostDisconnected(): void {
    cancelAnimationFrame(this.move);
    clearTimeout(this.pause);
  }

  /** Looks from somewhere else at once, without saying so. */
  set(view: View): void {
    const before = isSectionView(this.view);
    const isSection = isSectionView(view);
    this.view = view;
    this.looked(view, isSection, isSection !== before);
    this.host.requestUpdate();
  }

  /** Goes to a view: `preset` names it, null when a hand has turned it there. */
  go(view: View, preset: PresetName | null): void {
    cancelAnimationFrame(this.move);
    this.preset = preset;
    if (preset === null || isCalm()) this.set(view);
    else this.moveTo(view);
    clearTimeout(this.pause);
    this.pause = setTimeout(() => {
      this.announced = `Seen ${viewWords(view)}.`;
      this.host.requestUpdate();
    }, announced_ms);
  }

  private moveTo(view: View): void {
    const from = this.view;
    let begun = 0;
    const step = (now: number) => {
      begun ||= now;
      const share = Math.min(1, (now - begun) / moves_ms);
      this.set(viewBetween(from, view, share * share * (3 - 2 * share)));
      if (share < 1) this.move = requestAnimationFrame(step);
    };
    this.move = requestAnimationFrame(step);
  }
}
