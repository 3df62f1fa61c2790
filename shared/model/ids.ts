/** Ids are UUIDs made by whoever creates the thing, so that a client can create offline and repeat safely. */
type Id<Kind extends string> = string & { readonly __id?: Kind };

export type UserId = Id<'user'>;
export type StudioId = Id<'studio'>;
export type AlbumId = Id<'album'>;
export type SpreadId = Id<'spread'>;
export type PrintId = Id<'print'>;
export type PileId = Id<'pile'>;
export type MatId = Id<'mat'>;
export type PaneGroupId = Id<'pane-group'>;
export type DetailId = Id<'detail'>;
export type CutSizeId = Id<'cut-size'>;
export type GrantId = Id<'grant'>;
export type StashSheetId = Id<'stash-sheet'>;

/** Which of the two facing pages. */
export type Side = 'left' | 'right';
export const SIDES: readonly Side[] = ['left', 'right'];

/** The only stored form of a colour: lower-case `#rrggbb` in sRGB. */
export type Hex = string & { readonly __colour?: 'hex' };

/** Quarter-turns clockwise. */
export type Turns = 0 | 1 | 2 | 3;
