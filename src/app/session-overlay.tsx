import { useSyncExternalStore } from 'react';
import { useNavigate } from 'react-router-dom';
import { Button } from '../components/ui/button';
import { Dialog } from '../components/ui/dialog';
import { SignInForm } from '../features/session/components/sign-in-form';
import { useSession, useSignOut } from '../lib/api/session';
import { isSessionLost, leftInstead, onSessionLossChange } from '../lib/api/session-loss';

/**
 * Opens above the page when the session has ended. The page keeps everything that was typed; after
 * the sign-in the requests that were waiting go on by themselves.
 */
export function SessionOverlay() {
  const lost = useSyncExternalStore(onSessionLossChange, isSessionLost);
  const session = useSession();
  const signOut = useSignOut();
  const navigate = useNavigate();
  const leave = () => {
    signOut.mutate(undefined, {
      onSettled: () => {
        leftInstead();
        void navigate('/sign-in');
      },
    });
  };
  return (
    <Dialog
      open={lost}
      onOpenChange={() => undefined}
      insistent
      title="Sign in to go on"
      description="Your session has ended. Nothing you typed is lost; the page goes on where it stopped."
      foot={<Button onClick={leave}>Leave this page instead</Button>}
    >
      <SignInForm email={session?.user.email} />
    </Dialog>
  );
}
