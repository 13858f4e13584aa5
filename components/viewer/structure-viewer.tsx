'use client';

import dynamic from 'next/dynamic';
import { useCallback, useEffect, useId, useRef, useState, type KeyboardEvent } from 'react';
import { buttonClass } from '@/components/ui/button';
import { Disclosure } from '@/components/ui/disclosure';
import { FlatProjection, type ViewerLabels } from './flat-projection';
import type { CanvasControls } from './molecule-canvas';
import { SphereTable } from './sphere-table';
import { atomNames, nearestAtoms, type ViewedStructure } from './viewed-structure';

const MoleculeCanvas = dynamic(() => import('./molecule-canvas'), { ssr: false });

const toggles: { key: keyof ViewerLabels; label: string }[] = [
  { key: 'distances', label: 'Distances' },
  { key: 'angles', label: 'Angles' },
  { key: 'names', label: 'Atom names' },
];

function useSeen() {
  const element = useRef<HTMLDivElement>(null);
  const [seen, setSeen] = useState(false);
  useEffect(() => {
    if (element.current === null) return undefined;
    const observer = new IntersectionObserver(
      (entries) => {
        if (entries.some((entry) => entry.isIntersecting)) {
          setSeen(true);
          observer.disconnect();
        }
      },
      { rootMargin: '120px' },
    );
    observer.observe(element.current);
    return () => observer.disconnect();
  }, []);
  return { element, seen };
}

/** Degrees and factors of one key press; null for a key that means nothing here. */
function keyAction(key: string): ((controls: CanvasControls) => void) | null {
  switch (key) {
    case 'ArrowLeft':
      return (controls) => controls.rotate(-12, 'y');
    case 'ArrowRight':
      return (controls) => controls.rotate(12, 'y');
    case 'ArrowUp':
      return (controls) => controls.rotate(-12, 'x');
    case 'ArrowDown':
      return (controls) => controls.rotate(12, 'x');
    case '+':
    case '=':
      return (controls) => controls.zoom(1.15);
    case '-':
      return (controls) => controls.zoom(1 / 1.15);
    case '0':
    case 'Home':
      return (controls) => controls.reset();
    default:
      return null;
  }
}

/**
 * A structure in 3D: all atoms, each metal's sphere with dashed distance lines; distances shown at first, angles and
 * atom names on demand. Picking an atom lists what stands near it. The table below says the same in words.
 */
export function StructureViewer({ structure }: { structure: ViewedStructure }) {
  const { element, seen } = useSeen();
  const id = useId();
  const [labels, setLabels] = useState<ViewerLabels>({ distances: true, angles: false, names: false });
  const [picked, setPicked] = useState<number | null>(null);
  const [flat, setFlat] = useState(false);
  const [controls, setControls] = useState<CanvasControls | null>(null);
  const onUnable = useCallback(() => setFlat(true), []);
  const names = atomNames(structure.elements);
  const near = picked === null ? [] : nearestAtoms(structure, picked);

  const onKeyDown = (event: KeyboardEvent) => {
    const action = event.ctrlKey || event.metaKey || event.altKey ? null : keyAction(event.key);
    if (action === null || controls === null) return;
    event.preventDefault();
    action(controls);
  };
  const savePng = () => {
    if (controls === null) return;
    const link = document.createElement('a');
    link.href = controls.png();
    link.download = `${structure.title.replace(/[^\w.-]+/g, '-')}.png`;
    link.click();
  };

  return (
    <figure ref={element}>
      <div
        role="group"
        tabIndex={0}
        aria-label={`Structure of ${structure.title} in 3D`}
        aria-describedby={`${id}-keys`}
        onKeyDown={onKeyDown}
        className="relative h-[320px] touch-pan-y border border-rule"
      >
        {flat ? (
          <div className="grid h-full place-items-center overflow-hidden">
            <FlatProjection structure={structure} labels={labels} />
          </div>
        ) : seen ? (
          <MoleculeCanvas
            structure={structure}
            labels={labels}
            picked={picked}
            onPick={setPicked}
            onReady={setControls}
            onUnable={onUnable}
          />
        ) : null}
      </div>
      <div className="mt-2 flex flex-wrap items-center gap-x-1.5 gap-y-1 print:hidden">
        {toggles.map(({ key, label }) => (
          <button
            key={key}
            type="button"
            aria-pressed={labels[key]}
            onClick={() => setLabels((shown) => ({ ...shown, [key]: !shown[key] }))}
            className="border border-transparent px-2.5 py-1 text-small text-ink-2 hover:border-rule-strong aria-pressed:border-ink aria-pressed:text-ink"
          >
            {label}
          </button>
        ))}
        <span className="flex-1" />
        <button
          type="button"
          disabled={controls === null}
          onClick={() => controls?.reset()}
          className={buttonClass('quiet', 'small')}
        >
          Reset view
        </button>
        <button
          type="button"
          disabled={controls === null}
          onClick={savePng}
          className={buttonClass('quiet', 'small')}
        >
          Save as PNG
        </button>
      </div>
      <p id={`${id}-keys`} className="text-note text-ink-3">
        {flat
          ? 'This browser cannot draw in 3D: a still projection stands in. Distances in Å.'
          : 'Drag or use the arrow keys to turn, + and − to zoom, 0 to reset. Distances in Å, angles in degrees.'}
      </p>
      <div className="mt-3 grid grid-cols-[auto_minmax(0,1fr)] items-start gap-x-4 text-small max-book:grid-cols-1">
        <label className="flex items-center gap-2 text-ink-2">
          Around
          <select
            value={picked ?? ''}
            onChange={(event) => setPicked(event.target.value === '' ? null : Number(event.target.value))}
            className="rounded border border-rule-strong bg-page px-2 py-1 text-ink"
          >
            <option value="">pick an atom</option>
            {names.map((name, index) => (
              <option key={index} value={index}>
                {name}
              </option>
            ))}
          </select>
        </label>
        <p aria-live="polite" className="py-1">
          {picked === null
            ? null
            : near.length === 0
              ? `Nothing within 3 Å of ${names[picked]}.`
              : `${names[picked]}: ${near.map((other) => `${names[other.index]} ${other.distanceAngstrom.toFixed(3)} Å`).join(', ')}`}
        </p>
      </div>
      <figcaption className="mt-2">
        <Disclosure summary="The sphere as a table">
          <SphereTable structure={structure} />
        </Disclosure>
      </figcaption>
    </figure>
  );
}
