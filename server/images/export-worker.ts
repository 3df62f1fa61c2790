import sharp from 'sharp';
import { exportSpread } from './export-spread';
import { serveTasks } from './serve-tasks';

// Every layer is read once: a cache would only hold memory.
sharp.cache(false);

serveTasks(exportSpread);
