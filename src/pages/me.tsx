import { useQuery } from '@tanstack/react-query';
import { LookSettings } from '../features/people/components/look-settings.tsx';
import { OwnNameForm } from '../features/people/components/own-name-form.tsx';
import { OwnPasswordForm } from '../features/people/components/own-password-form.tsx';
import { SignOutEverywhere } from '../features/people/components/sign-out-everywhere.tsx';
import { ownQuery } from '../features/people/api.ts';
import { usePerson } from '../http/session.ts';
import { ErrorState } from '../ui/error-state.tsx';
import { LoadingState } from '../ui/loading-state.tsx';
import { Page } from '../ui/page.tsx';
import { RuleHead } from '../ui/rule-head.tsx';
import { Spread } from '../ui/spread.tsx';

/** One's own account: name and password at the left, how the book looks and the way out at the right. */
export function Component() {
  const person = usePerson();
  const own = useQuery(ownQuery);
  return (
    <main id="content">
      <div className="case-head">
        <div>
          <span className="eyebrow">{person.organisationName}</span>
          <h1>Your settings</h1>
        </div>
      </div>
      {own.isPending ? <LoadingState words="Reading your settings…" /> : null}
      {own.isError ? <ErrorState what="Your settings could not be read." why={own.error.message} /> : null}
      {own.data ? (
        <Spread shape="even">
          <Page label="Your account">
            <RuleHead level={2} aside={person.roles.join(', ')}>
              Your account
            </RuleHead>
            <OwnNameForm own={own.data} />
            <RuleHead level={2}>Password</RuleHead>
            <OwnPasswordForm owner={own.data} />
          </Page>
          <Page label="How the book looks">
            <RuleHead level={2} aside="on every machine">
              How the book looks
            </RuleHead>
            <LookSettings settings={own.data.settings} />
            <RuleHead level={2}>Signing out</RuleHead>
            <SignOutEverywhere />
          </Page>
        </Spread>
      ) : null}
    </main>
  );
}
