/** What Compose says: announcements of drags, labels of controls. */
export const compose = {
  aPrint: 'A print',
  nothing: 'nothing; let go there and it goes back',
  theTable: 'the table',
  mat: (label: string) => `mat ${label}`,
  cells: (mat: { x: number; y: number; w: number; h: number }) =>
    `${mat.w} by ${mat.h} steps, ${mat.x} from the left, ${mat.y} from the top`,
  pickedUp: (name: string) => `${name} picked up.`,
  over: (place: string) => `Over ${place}.`,
  placed: (name: string, place: string) => `${name} placed on ${place}.`,
  putDown: (name: string) => `${name} placed.`,
  putBack: (name: string) => `${name} put back.`,
  dragHelp:
    'Press Space to pick up, the arrow keys to move, Space or Enter to place, Escape to put back. A window moves by the trimmer’s finest mark, with Shift by four.',
} as const;
