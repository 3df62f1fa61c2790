import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { NavLink, useNavigate } from 'react-router-dom';
import type { Studio } from '#shared/contracts/accounts';
import { UpDownIcon } from '@/components/icons';
import { Menu, MenuItem } from '@/components/menu';
import { useMay, useSession } from '@/lib/session';
import { albumQueries } from '../api/album-queries';
import { NewAlbumDialog } from './new-album-dialog';

/** The left rail of a studio's screens: which studio, its albums, its members. */
export function StudioRail({ studio }: { readonly studio: Studio }) {
  const [isOpen, setIsOpen] = useState(false);
  return (
    <aside className="rail" aria-label="Studio">
      <StudioSwitch studio={studio} />
      <button
        type="button"
        className="btn mt-2 w-full lg:hidden"
        aria-expanded={isOpen}
        aria-controls="rail-more"
        onClick={() => setIsOpen(!isOpen)}
      >
        {isOpen ? 'Fold up' : 'Albums, prints, stash and members'}
      </button>
      <div id="rail-more" className={isOpen ? undefined : 'max-lg:hidden'}>
        <RailAlbums studio={studio} />
        <ul className="rail-list rail-more">
          <li>
            <NavLink to={`/studios/${studio.id}/prints`}>Prints</NavLink>
          </li>
          <li>
            <NavLink to={`/studios/${studio.id}/stash`}>Stash</NavLink>
          </li>
        </ul>
        <RailMembers studio={studio} />
      </div>
    </aside>
  );
}

function StudioSwitch({ studio }: { readonly studio: Studio }) {
  const { studios } = useSession();
  const navigate = useNavigate();
  const words = (
    <>
      <span>Studio</span>
      <b>{studio.name}</b>
    </>
  );
  if (studios.length < 2) return <div className="rail-studio">{words}</div>;
  return (
    <Menu
      trigger={
        <button type="button" className="rail-studio" aria-label={`Studio ${studio.name}: choose another`}>
          {words}
          <UpDownIcon />
        </button>
      }
    >
      {studios.map(({ id, name, role }) => (
        <MenuItem key={id} onSelect={() => void navigate(`/studios/${id}`)}>
          <span className={id === studio.id ? 'font-semibold' : ''}>{name}</span>
          <span className="text-12 opacity-80">{role}</span>
        </MenuItem>
      ))}
    </Menu>
  );
}

function RailAlbums({ studio }: { readonly studio: Studio }) {
  const { data: albums = [] } = useQuery(albumQueries.list(studio.id));
  const may = useMay();
  const navigate = useNavigate();
  const [isMaking, setIsMaking] = useState(false);
  return (
    <nav aria-label="Albums">
      <h2 className="rail-head">
        <NavLink to={`/studios/${studio.id}`} end className="no-underline hover:underline">
          Albums
        </NavLink>
      </h2>
      <ul className="rail-list">
        {albums.map(({ id, title, spreadCount }) => (
          <li key={id}>
            <NavLink to={`/albums/${id}`} className="min-w-0 truncate">
              {title}
            </NavLink>
            <span className="num">
              {spreadCount}
              <span className="sr-only"> spreads</span>
            </span>
          </li>
        ))}
        {may('album:edit', { studioId: studio.id }) && (
          <li>
            <button type="button" className="hover:underline" onClick={() => setIsMaking(true)}>
              New album
            </button>
          </li>
        )}
      </ul>
      {isMaking && (
        <NewAlbumDialog studio={studio} onClose={() => setIsMaking(false)} onMade={(albumId) => void navigate(`/albums/${albumId}`)} />
      )}
    </nav>
  );
}

function RailMembers({ studio }: { readonly studio: Studio }) {
  const { data: members = [] } = useQuery(albumQueries.members(studio.id));
  return (
    <section aria-labelledby="rail-members">
      <h2 className="rail-head" id="rail-members">
        Members
      </h2>
      <ul className="rail-list rail-members">
        {members.map(({ userId, name, role }) => (
          <li key={userId}>
            <i className="who not-italic" aria-hidden="true">
              {name.slice(0, 2)}
            </i>
            <span className="min-w-0 truncate text-14! text-ink!">{name}</span>
            <span className="ml-auto">{role}</span>
          </li>
        ))}
      </ul>
    </section>
  );
}
