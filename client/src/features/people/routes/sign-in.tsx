import { Navigate, useSearchParams } from 'react-router-dom';
import { BrandMark } from '../../../components/brand-mark';
import { useDocumentTitle } from '../../../components/page-title';
import { useMe } from '../api/get-me';
import { returnPath } from '../components/return-path';
import { SignInForm } from '../components/sign-in-form';
import '../components/entry.css';

export default function SignInPage() {
  const me = useMe();
  const [search] = useSearchParams();
  useDocumentTitle('Sign in');
  if (me.data) return <Navigate to={returnPath(search.get('to'))} replace />;
  return (
    <main className="entry">
      <p className="entry-brand">
        <BrandMark /> Weighhouse
      </p>
      <h1>Sign in</h1>
      <p className="soft">
        Opinions on one case, collected before anyone sways the others, and weighed together.
      </p>
      <SignInForm />
      <p className="soft small">
        You come in by an invitation from your administrator. If you forgot your password, ask for a new one.
      </p>
    </main>
  );
}
