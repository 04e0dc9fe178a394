import { useState, type FormEvent } from 'react';
import { Link, useLocation, useNavigate } from 'react-router-dom';
import { Brand } from '../components/ui/brand';
import { IconButton } from '../components/ui/button';
import { useTheme } from '../hooks/use-theme';
import type { Role, Session } from '../lib/api/session';
import { applicationPath } from '../lib/paths';
import { homeOf, placeOf, PLACES } from './places';
import { NarrowMenu, PersonMenu } from './person-menu';

/** Half dark, half light: the theme's switch. */
function ThemeSwitch() {
  const { theme, switchTheme } = useTheme();
  return (
    <IconButton label={theme === 'dark' ? 'Light theme' : 'Dark theme'} onClick={switchTheme}>
      <svg width={18} height={18} viewBox="0 0 18 18" aria-hidden="true">
        <circle cx={9} cy={9} r={6.5} fill="none" stroke="currentColor" strokeWidth={1.5} />
        <path d="M9 2.5a6.5 6.5 0 0 1 0 13Z" fill="currentColor" />
      </svg>
    </IconButton>
  );
}

function FindByNumber({ role }: { role: Role }) {
  const [text, setText] = useState('');
  const navigate = useNavigate();
  const go = (event: FormEvent) => {
    event.preventDefault();
    const number = text.trim();
    if (number === '') return;
    setText('');
    void navigate(applicationPath(role, encodeURIComponent(number)));
  };
  return (
    <form role="search" onSubmit={go}>
      <label className="find">
        <svg width={14} height={14} viewBox="0 0 14 14" aria-hidden="true">
          <circle cx={6} cy={6} r={4.6} fill="none" stroke="currentColor" strokeWidth={1.5} />
          <path d="M9.5 9.5 13 13" stroke="currentColor" strokeWidth={1.5} />
        </svg>
        <span className="sr-only">Find an application by its number</span>
        <input
          type="search"
          placeholder="Find by number"
          value={text}
          onChange={(event) => setText(event.target.value)}
        />
      </label>
    </form>
  );
}

/** Mark, places, search, person, theme. */
export function TopBar({ session }: { session: Session }) {
  const places = PLACES[session.role];
  const current = placeOf(places, useLocation().pathname);
  return (
    <header className="top-bar">
      <div className="top-bar-in">
        <Link to={homeOf(session.role)} aria-label="Counterpoise, first page">
          <Brand />
        </Link>
        <nav className="places" aria-label="Places">
          {places.map((place) => (
            <Link key={place.to} to={place.to} aria-current={place === current ? 'page' : undefined}>
              {place.label}
            </Link>
          ))}
        </nav>
        <div className="ml-auto flex items-center gap-3">
          <FindByNumber role={session.role} />
          <PersonMenu session={session} />
          <ThemeSwitch />
          <NarrowMenu session={session} places={places} />
        </div>
      </div>
    </header>
  );
}
