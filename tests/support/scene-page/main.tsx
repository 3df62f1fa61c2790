import { createRoot } from 'react-dom/client';
import { flushSync } from 'react-dom';
import type { Scene } from '#shared/scene/scene';
import { SceneDrawing } from '@/components/scene/scene-drawing';
import '@/fonts.css';

declare global {
  interface Window {
    /** Draws a scene on the whole page; settles once its fonts and pictures are there. */
    drawSceneOnPage: (scene: Scene) => Promise<void>;
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
  await document.fonts.load('16px "Young Serif"');
  await document.fonts.load('italic 16px "Atkinson Next"');
  await document.fonts.load('16px "Atkinson Next"');
  const pictures = [...document.querySelectorAll('image')];
  await Promise.all(pictures.map((picture) => decoded(picture.href.baseVal)));
  // Two frames: one to lay out what has just loaded, one to paint it.
  await new Promise((done) => requestAnimationFrame(() => requestAnimationFrame(done)));
};

async function decoded(url: string): Promise<void> {
  const image = new Image();
  image.src = url;
  await image.decode();
}
