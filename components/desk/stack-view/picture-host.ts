import type { StackInks } from '../../../scenes/inks.js';
import type { StackPicture } from '../../../scenes/stack-picture.js';

/** A picture on a canvas of its own inside `place`, and the way to take both out again. */
export interface HostedPicture {
  readonly picture: StackPicture;
  readonly remove: () => void;
}

/**
 * Fetches what draws in three dimensions, which the first sight of the page need not wait for, and
 * puts a picture into `place`.
 *
 * @param changed told `lost` when the graphics card drops the picture, `restored` when it is back.
 * @returns null where there is no WebGL2, or when `place` has left the page meanwhile.
 */
export async function hostPicture(
  place: HTMLElement,
  inks: StackInks,
  changed: (state: 'lost' | 'restored') => void,
): Promise<HostedPicture | null> {
  const { stackPicture } = await import('../../../scenes/stack-picture.js');
  if (!place.isConnected) return null;
  const canvas = document.createElement('canvas');
  canvas.setAttribute('aria-hidden', 'true');
  const picture = stackPicture(canvas, inks);
  if (!picture) return null;
  const watched = new AbortController();
  const { signal } = watched;
  canvas.addEventListener(
    'webglcontextlost',
    (event) => {
      event.preventDefault();
      changed('lost');
    },
    { signal },
  );
  canvas.addEventListener('webglcontextrestored', () => changed('restored'), { signal });
  place.append(canvas);
  return {
    picture,
    remove: () => {
      watched.abort();
      picture.dispose();
      canvas.remove();
    },
  };
}
