import { useNavigate, useParams } from 'react-router-dom';
import { acceptInvitation } from '../features/people/api.ts';
import { Frontispiece } from '../features/people/components/frontispiece.tsx';
import { NewPasswordForm } from '../features/people/components/new-password-form.tsx';
import { OneTimeLink } from '../features/people/components/one-time-link.tsx';
import { takeSession } from '../http/session.ts';

/** Where an invitation is accepted, by choosing a password. */
export function Component() {
  const { token = '' } = useParams();
  const navigate = useNavigate();
  return (
    <Frontispiece>
      <OneTimeLink purpose="invitations" token={token} wayOn="Ask the laboratory to send the invitation again.">
        {(link) => (
          <>
            <h2 className="mb-2 text-h3">You are invited, {link.name}</h2>
            <p className="mb-5 text-ink-2">
              {link.organisationName}, as <b className="text-ink">{link.mail}</b>. Choose a password and the account is
              yours.
            </p>
            <NewPasswordForm
              owner={link}
              verb="Accept the invitation"
              onChosen={async (password) => {
                const session = await acceptInvitation(token, password);
                if (session) takeSession(session);
                await navigate('/');
              }}
            />
          </>
        )}
      </OneTimeLink>
    </Frontispiece>
  );
}
