import Link from 'next/link';
import type { ReactNode } from 'react';
import { SearchField } from './search-field';
import { ThemeToggle } from './theme-toggle';
import { Wordmark } from './wordmark';

/** One step of the way from the group to this page; the last one may have no address. */
export interface Place {
  name: string;
  href?: string;
}

/** A person of the group: initials shown, name and role on hover and for screen readers. */
export interface MastheadPerson {
  initials: string;
  name: string;
  role: string;
  /** The person who is signed in. */
  current?: boolean;
}

export interface MastheadProps {
  home?: string;
  places?: readonly Place[];
  people?: readonly MastheadPerson[];
  /** Whose people they are: "People in this study". */
  peopleLabel?: string;
  searchAction?: string | null;
  searchValue?: string;
  /** Account menu, sign-out and the like, at the right end. */
  children?: ReactNode;
}

/** The line above the book: name, place, search, people, theme. */
export function Masthead({
  home = '/',
  places = [],
  people = [],
  peopleLabel = 'People in this study',
  searchAction = '/search',
  searchValue,
  children,
}: MastheadProps) {
  return (
    <header className="flex min-h-[54px] items-center gap-7 px-edge pt-3.5 max-book:flex-wrap max-book:gap-x-3.5 max-book:gap-y-2.5 max-book:pt-2.5 print:hidden">
      <Link href={home} className="no-underline">
        <Wordmark />
      </Link>
      {places.length > 0 ? (
        <nav aria-label="Place" className="max-book:order-3 max-book:w-full">
          <ol className="flex flex-wrap gap-2 text-small text-ink-2">
            {places.map((place, index) => (
              <li key={place.name} className="flex gap-2">
                {index > 0 ? (
                  <span aria-hidden="true" className="text-ink-3">
                    /
                  </span>
                ) : null}
                {place.href === undefined ? (
                  <span aria-current="page">{place.name}</span>
                ) : (
                  <Link href={place.href}>{place.name}</Link>
                )}
              </li>
            ))}
          </ol>
        </nav>
      ) : null}
      <span className="flex-1" />
      {searchAction === null ? null : <SearchField action={searchAction} value={searchValue} />}
      {people.length > 0 ? (
        <ul
          aria-label={peopleLabel}
          className="flex gap-3.5 font-serif text-[1rem] leading-none italic max-book:gap-2.5"
        >
          {people.map((person) => (
            <li
              key={person.name}
              title={`${person.name}, ${person.role}`}
              aria-current={person.current ? 'true' : undefined}
              className={`border-b pb-[3px] ${person.current ? 'border-ink' : 'border-transparent'}`}
            >
              <span aria-hidden="true">{person.initials}</span>
              <span className="sr-only">{`${person.name}, ${person.role}${person.current ? ' (you)' : ''}`}</span>
            </li>
          ))}
        </ul>
      ) : null}
      {children}
      <ThemeToggle />
    </header>
  );
}
