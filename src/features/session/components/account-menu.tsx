import { useNavigate } from 'react-router-dom';
import { Menu, MenuItem } from '@/components/menu';
import { useSession } from '@/lib/session';
import { useSignOut } from '../api/session-queries';

/** The signed-in person, at the right end of the bar. */
export function AccountMenu() {
  const { user } = useSession();
  const signOut = useSignOut();
  const navigate = useNavigate();
  return (
    <Menu
      align="end"
      trigger={
        <button type="button" className="who ml-2" data-size="big" aria-label={`Account of ${user.name}`} title={user.email}>
          {user.name.slice(0, 2)}
        </button>
      }
    >
      <p className="px-3 pt-2 pb-1 text-12 text-ink-2">
        {user.name}
        <br />
        {user.email}
      </p>
      <MenuItem onSelect={() => signOut.mutate(undefined, { onSuccess: () => void navigate('/sign-in', { replace: true }) })}>Sign out</MenuItem>
    </Menu>
  );
}
