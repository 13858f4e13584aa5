'use client';

import { useId, useRef, useState, type KeyboardEvent, type ReactNode } from 'react';

export interface TabPanel {
  key: string;
  label: ReactNode;
  panel: ReactNode;
}

/** Panels that share one place, moved between with the arrow keys. Pages of a study use `IndexTabs` instead. */
export function Tabs({
  label,
  panels,
  first,
}: {
  label: string;
  panels: readonly TabPanel[];
  first?: string;
}) {
  const [current, setCurrent] = useState(first ?? panels[0]?.key);
  const buttons = useRef(new Map<string, HTMLButtonElement>());
  const id = useId();
  const move = (event: KeyboardEvent) => {
    const at = panels.findIndex(({ key }) => key === current);
    const next = { ArrowRight: at + 1, ArrowLeft: at - 1, Home: 0, End: panels.length - 1 }[event.key];
    if (next === undefined) return;
    event.preventDefault();
    const panel = panels[(next + panels.length) % panels.length];
    if (panel === undefined) return;
    setCurrent(panel.key);
    buttons.current.get(panel.key)?.focus();
  };
  return (
    <div>
      <div
        role="tablist"
        aria-label={label}
        onKeyDown={move}
        className="flex gap-1 overflow-x-auto border-b border-rule-strong"
      >
        {panels.map(({ key, label: words }) => (
          <button
            key={key}
            ref={(element) => {
              if (element === null) buttons.current.delete(key);
              else buttons.current.set(key, element);
            }}
            type="button"
            role="tab"
            id={`${id}-${key}-tab`}
            aria-selected={key === current}
            aria-controls={`${id}-${key}`}
            tabIndex={key === current ? 0 : -1}
            onClick={() => setCurrent(key)}
            className="border-b-2 border-transparent px-3.5 py-2 text-small whitespace-nowrap text-ink-2 hover:text-ink aria-selected:border-ink aria-selected:font-semibold aria-selected:text-ink"
          >
            {words}
          </button>
        ))}
      </div>
      {panels.map(({ key, panel }) => (
        <div
          key={key}
          role="tabpanel"
          id={`${id}-${key}`}
          aria-labelledby={`${id}-${key}-tab`}
          hidden={key !== current}
          className="pt-4"
        >
          {panel}
        </div>
      ))}
    </div>
  );
}
