import { NavLink, useNavigate } from 'react-router-dom';
import { Menu, MenuChoice, MenuItem, MenuLabel } from '../components/ui/menu';
import { useSignOut, useSwitchOrganisation, type Role, type Session } from '../lib/api/session';
import { homeOf, type Place } from './places';

const ROLE_WORDS: Record<Role, string> = {
  applicant: 'Applicant',
  reviewer: 'Reviewer',
  administrator: 'Administrator',
};

/** The organisation to work for (for those who belong to several), one's account, the way out. */
function PersonItems({ session }: { session: Session }) {
  const navigate = useNavigate();
  const signOut = useSignOut();
  const switchTo = useSwitchOrganisation();
  // The menu is gone by the time the answer comes: a promise goes on, a mutation's own callbacks would not.
  const leave = async () => {
    await signOut.mutateAsync().catch(() => undefined);
    await navigate('/sign-in');
  };
  const change = async (organisationId: string) => {
    const next = await switchTo.mutateAsync(organisationId);
    if (next) await navigate(homeOf(next.role));
  };
  return (
    <>
      {session.memberships.length > 1 && (
        <MenuChoice
          label="Work for"
          value={session.organisation.id}
          onChange={(organisationId) => void change(organisationId)}
          options={session.memberships.map((membership) => ({
            value: membership.organisationId,
            label: membership.organisationName,
            detail: ROLE_WORDS[membership.role].toLowerCase(),
          }))}
        />
      )}
      {session.role === 'reviewer' && (
        <MenuItem onSelect={() => navigate('/rules')}>Rules of the check</MenuItem>
      )}
      <MenuItem onSelect={() => navigate('/account')}>Your account</MenuItem>
      {session.demo && <MenuItem onSelect={() => navigate('/mail-room')}>Mail room</MenuItem>}
      <MenuItem onSelect={() => void leave()}>Sign out</MenuItem>
    </>
  );
}

export function PersonMenu({ session }: { session: Session }) {
  const trigger = (
    <button type="button" className="person">
      {session.user.name}
      <span>
        {session.role === 'applicant'
          ? session.organisation.name
          : `${ROLE_WORDS[session.role]}, ${session.organisation.name}`}
      </span>
    </button>
  );
  return (
    <Menu trigger={trigger}>
      <PersonItems session={session} />
    </Menu>
  );
}

/** On narrow screens the places and the person share one menu. */
export function NarrowMenu({ session, places }: { session: Session; places: readonly Place[] }) {
  const trigger = (
    <button type="button" className="menu-trigger">
      Menu
    </button>
  );
  return (
    <Menu trigger={trigger}>
      {places.map((place) => (
        <MenuItem key={place.to} asLink>
          <NavLink to={place.to}>{place.label}</NavLink>
        </MenuItem>
      ))}
      <MenuLabel>
        {session.user.name}, {session.organisation.name}
      </MenuLabel>
      <PersonItems session={session} />
    </Menu>
  );
}
