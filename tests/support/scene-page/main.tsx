import { createRoot } from 'react-dom/client';
import { flushSync } from 'react-dom';
import type { Scene } from '#shared/scene/scene';
import { SceneDrawing } from '@/components/scene/scene-drawing';
import '@/fonts.css';

declare global {
  interface Window {
    /** Draws a scene on the whole page; settles once its fonts and pictures are there. */
    drawSceneOnPage: (scene: Scene) => Promise<void>;
    /** Advance widths of single characters at a size of 1000 px, as this browser measures them. */
    measureCharacters: (font: string, characters: readonly string[]) => Promise<number[]>;
  }
}

document.body.style.margin = '0';
const root = createRoot(document.getElementById('root')!);

window.drawSceneOnPage = async (scene) => {
  flushSync(() =>
    root.render(
      <div style={{ width: '100vw', height: '100vh' }}>
        <SceneDrawing scene={scene} pictureSize="medium" />
      </div>,
    ),
  );
  await document.fonts.ready;
  const pictures = [...document.querySelectorAll('image')];
  await Promise.all(pictures.map((picture) => decoded(picture.href.baseVal)));
  // Two frames: one to lay out what has just loaded, one to paint it.
  await new Promise((done) => requestAnimationFrame(() => requestAnimationFrame(done)));
};

window.measureCharacters = async (font, characters) => {
  await document.fonts.load(`400 ${font}`, characters.join(''));
  const context = document.createElement('canvas').getContext('2d')!;
  context.font = `400 ${font}`;
  return characters.map((character) => context.measureText(character).width);
};

async function decoded(url: string): Promise<void> {
  const image = new Image();
  image.src = url;
  await image.decode();
}
