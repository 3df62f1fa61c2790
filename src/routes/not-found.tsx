import { Link } from 'react-router-dom';
import { PlainPage } from '@/components/plain-page';

export function NotFound({ hasBar = true }: { readonly hasBar?: boolean }) {
  return (
    <PlainPage title="Nothing lies here" hasBar={hasBar}>
      <p>The page you asked for does not exist, was thrown away, or belongs to a studio that you are not in.</p>
      <p className="mt-4">
        <Link to="/" className="btn" data-variant="paper">
          To your albums
        </Link>
      </p>
    </PlainPage>
  );
}
