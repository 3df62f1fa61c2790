import type { MatId, PrintId } from '#shared/model/ids';

export type Edge = 'n' | 'e' | 's' | 'w' | 'ne' | 'se' | 'sw' | 'nw';

/** What a drag holds. */
export type DragData =
  | { readonly type: 'print'; readonly printId: PrintId }
  | { readonly type: 'carried'; readonly matId: MatId; readonly printId: PrintId }
  | { readonly type: 'mat'; readonly matId: MatId }
  | { readonly type: 'resize'; readonly matId: MatId; readonly edge: Edge }
  | { readonly type: 'window'; readonly matId: MatId };

/** Where a drag can end. */
export type DropData = { readonly type: 'mat'; readonly matId: MatId; readonly z: number } | { readonly type: 'table' };

export const TABLE_DROP_ID = 'table';
export const matDropId = (matId: MatId): string => `drop/${matId}`;

/** Only prints are dropped on something; the other drags change the document as they go. */
export const isPrintDrag = (data: DragData | undefined): data is Extract<DragData, { printId: PrintId }> =>
  data?.type === 'print' || data?.type === 'carried';
