import { writeFile } from 'node:fs/promises';
import type { Sharp } from 'sharp';
import type { CreateExport } from '../../shared/contracts/exports';
import type { PrintId } from '../../shared/model/ids';
import { toInches } from '../../shared/model/length';
import type { Scene } from '../../shared/scene/scene';
import { drawScene } from './draw-scene';
import { withJfifDensity } from './jfif-density';

export interface ExportTask {
  readonly scene: Scene;
  readonly widthPx: number;
  readonly format: CreateExport['format'];
  /** The original file of every print in the scene. */
  readonly picturePaths: Readonly<Record<PrintId, string>>;
  readonly outputPath: string;
}

export interface ExportResult {
  readonly widthPx: number;
  readonly heightPx: number;
  readonly bytes: number;
}

const JPEG_OPTIONS = { quality: 92, chromaSubsampling: '4:4:4' } as const;
/** Measured: higher levels take several times as long for a few per cent of a photograph's bytes. */
const PNG_OPTIONS = { compressionLevel: 4 } as const;

/** Reading the photos is about this part of the work; the rest is writing the file. */
const READING_SHARE = 0.8;

/** Draws a spread into one file in sRGB with its density recorded, such that it prints at true size. */
export async function exportSpread(task: ExportTask, onProgress: (share: number) => void = () => undefined): Promise<ExportResult> {
  const { scene, widthPx, format, picturePaths, outputPath } = task;
  const ppi = widthPx / toInches(scene.width);
  const photos = scene.items.filter(({ kind }) => kind === 'photo').length;
  let read = 0;
  const drawing = await drawScene(scene, {
    widthPx,
    loadPicture: async (id) => {
      const data = picturePaths[id];
      if (data === undefined) throw new Error(`No file for print ${id}`);
      onProgress((READING_SHARE * read) / photos);
      read += 1;
      return { data };
    },
  });
  const { width, height, size } = await WRITERS[format](drawing.withMetadata({ density: ppi }), ppi, outputPath);
  return { widthPx: width, heightPx: height, bytes: size };
}

interface Written {
  readonly width: number;
  readonly height: number;
  readonly size: number;
}

const WRITERS: Record<CreateExport['format'], (drawing: Sharp, ppi: number, path: string) => Promise<Written>> = {
  png: (drawing, _ppi, path) => drawing.png(PNG_OPTIONS).toFile(path),
  jpeg: async (drawing, ppi, path) => {
    const { data, info } = await drawing.jpeg(JPEG_OPTIONS).toBuffer({ resolveWithObject: true });
    const jpeg = withJfifDensity(data, ppi);
    await writeFile(path, jpeg);
    return { width: info.width, height: info.height, size: jpeg.length };
  },
};
