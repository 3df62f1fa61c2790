import type { CutSize } from '../../shared/model/cut-size';
import type { Binding, PageFormat } from '../../shared/model/page-format';
import type { CutSizeEntity } from '../entities/cut-size-entity';
import type { CountedAlbum } from '../services/album-service';

interface AlbumAnswer {
  readonly id: string;
  readonly studioId: string;
  readonly title: string;
  readonly format: PageFormat;
  readonly binding: Binding;
  readonly spreadCount: number;
  readonly binned: boolean;
}

export const presentAlbum = ({ album, spreadCount }: CountedAlbum): AlbumAnswer => ({
  id: album.id,
  studioId: album.studioId,
  title: album.title,
  format: album.format,
  binding: album.binding,
  spreadCount,
  binned: album.binnedAt !== null,
});

export const presentCutSize = (cutSize: CutSizeEntity): CutSize => ({
  id: cutSize.id,
  name: cutSize.name,
  width: cutSize.width,
  height: cutSize.height,
  stock: cutSize.stock,
  kind: cutSize.kind,
  sets: cutSize.sets,
});
