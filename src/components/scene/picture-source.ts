import { createContext, type ReactNode } from 'react';
import type { PhotoItem } from '#shared/scene/scene';

/** What is drawn for a photo instead of its file, in pixels of the oriented original; null where there is nothing. */
export type PictureSource = (photo: PhotoItem) => ReactNode;

/** Pictures that need no server: where one is given, photos are drawn by it. */
export const PictureSourceContext = createContext<PictureSource | null>(null);
