import sharp from 'sharp';
import { readSheet } from './read-sheet';
import { serveTasks } from './serve-tasks';

// A decoder that is not needed here is one that no hostile file can reach.
sharp.block({ operation: ['VipsForeignLoad'] });
sharp.unblock({
  operation: ['VipsForeignLoadJpeg', 'VipsForeignLoadPng', 'VipsForeignLoadWebp', 'VipsForeignLoadTiff', 'VipsForeignLoadHeif'],
});
// Every picture is new: a cache would only hold memory.
sharp.cache(false);

serveTasks(readSheet);
