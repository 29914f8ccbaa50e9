import { Link, useNavigate, useParams } from 'react-router-dom';
import { setPasswordByLink } from '../features/people/api.ts';
import { Frontispiece } from '../features/people/components/frontispiece.tsx';
import { NewPasswordForm } from '../features/people/components/new-password-form.tsx';
import { OneTimeLink } from '../features/people/components/one-time-link.tsx';
import { queryClient } from '../http/query-client.ts';

/** Where a new password is set over the link of a mail. */
export function Component() {
  const { token = '' } = useParams();
  const navigate = useNavigate();
  return (
    <Frontispiece>
      <OneTimeLink
        purpose="password-links"
        token={token}
        wayOn={
          <>
            <Link to="/password">Ask for another link</Link>; it holds one hour.
          </>
        }
      >
        {(link) => (
          <>
            <h2 className="mb-2 text-h3">A new password</h2>
            <p className="mb-5 text-ink-2">
              For <b className="text-ink">{link.mail}</b>. You will be signed out on every machine.
            </p>
            <NewPasswordForm
              owner={link}
              verb="Keep the new password"
              onChosen={async (password) => {
                await setPasswordByLink(token, password);
                queryClient.clear();
                await navigate('/sign-in?set=1');
              }}
            />
          </>
        )}
      </OneTimeLink>
    </Frontispiece>
  );
}
