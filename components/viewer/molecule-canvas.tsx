'use client';

import { useEffect, useRef } from 'react';
import type { AtomSpec, GLViewer } from '3dmol';
import { atomColour } from './atom-colours';
import type { ViewerLabels } from './flat-projection';
import { resolveColour } from './resolve-colour';
import {
  atomNames,
  distanceAngstrom,
  drawnBonds,
  sphereAngles,
  type ViewedStructure,
} from './viewed-structure';

/** What the buttons and keys around the canvas can do. */
export interface CanvasControls {
  rotate(degrees: number, axis: 'x' | 'y'): void;
  zoom(factor: number): void;
  reset(): void;
  /** data: URL of the picture as shown. */
  png(): string;
}

export interface MoleculeCanvasProps {
  structure: ViewedStructure;
  labels: ViewerLabels;
  picked: number | null;
  onPick: (index: number) => void;
  onReady: (controls: CanvasControls | null) => void;
  /** WebGL is missing or the drawing failed: the still projection takes over. */
  onUnable: () => void;
}

const point = ([x, y, z]: readonly [number, number, number]) => ({ x, y, z });

function hasWebGl(): boolean {
  const canvas = document.createElement('canvas');
  return canvas.getContext('webgl2') !== null || canvas.getContext('webgl') !== null;
}

/** The library leaves wide margins around small structures: step nearer to those. */
function openingZoom({ positionsAngstrom }: ViewedStructure): number {
  const reach = Math.max(
    ...[0, 1, 2].map((axis) => {
      const values = positionsAngstrom.map((position) => position[axis] ?? 0);
      return Math.max(...values) - Math.min(...values);
    }),
  );
  return reach < 5 ? 1.7 : reach < 8 ? 1.25 : 1;
}

function drawAtoms(viewer: GLViewer, structure: ViewedStructure, picked: number | null) {
  const bonded = new Map<number, number[]>();
  for (const [a, b] of drawnBonds(structure)) {
    bonded.set(a, [...(bonded.get(a) ?? []), b]);
    bonded.set(b, [...(bonded.get(b) ?? []), a]);
  }
  const metals = new Set(structure.centres.map((centre) => centre.index));
  const atoms: AtomSpec[] = structure.elements.map((elem, index) => ({
    elem,
    ...point(structure.positionsAngstrom[index] ?? [0, 0, 0]),
    bonds: bonded.get(index) ?? [],
    bondOrder: (bonded.get(index) ?? []).map(() => 1),
  }));
  const model = viewer.addModel();
  model.addAtoms(atoms);
  for (const [index, element] of structure.elements.entries()) {
    const scale = metals.has(index) ? 0.42 : element === 'H' ? 0.2 : 0.28;
    const color = atomColour(element);
    model.setStyle(
      { index },
      { stick: { radius: 0.1, color }, sphere: { scale: index === picked ? scale * 1.25 : scale, color } },
    );
  }
}

function drawSphere(viewer: GLViewer, structure: ViewedStructure, labels: ViewerLabels, within: Element) {
  const [calc, ink, ink2, page] = (['calc', 'ink', 'ink-2', 'page'] as const).map((token) =>
    resolveColour(token, within),
  );
  const names = atomNames(structure.elements);
  const label = (
    text: string,
    position: { x: number; y: number; z: number },
    fontColor: string | undefined,
    fontSize: number,
  ) =>
    viewer.addLabel(text, {
      position,
      fontColor,
      fontSize,
      font: '"Source Sans 3 Variable"',
      backgroundColor: page,
      backgroundOpacity: 0.92,
      borderThickness: 0,
      inFront: true,
      alignment: 'center',
    });
  for (const centre of structure.centres) {
    const metal = structure.positionsAngstrom[centre.index];
    if (metal === undefined) continue;
    const between = (to: readonly [number, number, number], share: number) => ({
      x: metal[0] + (to[0] - metal[0]) * share,
      y: metal[1] + (to[1] - metal[1]) * share,
      z: metal[2] + (to[2] - metal[2]) * share,
    });
    // 1.15 Å from the metal, between the two donors; of opposite donors there is no between.
    const outside = (middle: readonly [number, number, number]) => {
      const length = distanceAngstrom(metal, middle);
      return between(middle, length < 0.2 ? 1 : 1.15 / length);
    };
    for (const donor of centre.donors) {
      const end = structure.positionsAngstrom[donor.index];
      if (end === undefined) continue;
      viewer.addCylinder({
        start: point(metal),
        end: point(end),
        radius: 0.055,
        dashed: true,
        dashLength: 0.16,
        gapLength: 0.12,
        color: calc,
      });
      if (labels.distances) label(donor.distanceAngstrom.toFixed(3), between(end, 0.55), calc, 14);
    }
    if (labels.angles) {
      for (const { first, second, degrees } of sphereAngles(structure, centre)) {
        const [a, b] = [structure.positionsAngstrom[first], structure.positionsAngstrom[second]];
        if (a === undefined || b === undefined) continue;
        const middle = [(a[0] + b[0]) / 2, (a[1] + b[1]) / 2, (a[2] + b[2]) / 2] as const;
        label(`${degrees.toFixed(1)}°`, outside(middle), ink2, 12);
      }
    }
  }
  if (labels.names) {
    for (const [index, position] of structure.positionsAngstrom.entries()) {
      label(names[index] ?? '', point(position), ink, 13);
    }
  }
}

/** The 3D drawing itself; loaded only where it is seen. */
export default function MoleculeCanvas({
  structure,
  labels,
  picked,
  onPick,
  onReady,
  onUnable,
}: MoleculeCanvasProps) {
  const frame = useRef<HTMLDivElement>(null);
  const viewer = useRef<GLViewer | null>(null);
  const draw = useRef<(opening?: boolean) => void>(() => undefined);

  useEffect(() => {
    draw.current = (opening = false) => {
      const [current, element] = [viewer.current, frame.current];
      if (current === null || element === null) return;
      const view = current.getView();
      current.removeAllModels();
      current.removeAllShapes();
      current.removeAllLabels();
      drawAtoms(current, structure, picked);
      drawSphere(current, structure, labels, element);
      current.setClickable({}, true, (atom: AtomSpec) => {
        if (atom.index !== undefined) onPick(atom.index);
      });
      // An opaque ground: on a transparent canvas the labels' own paper would fade with it.
      current.setBackgroundColor(resolveColour('page', element), 1);
      if (opening) {
        current.rotate(28, 'y');
        current.rotate(12, 'x');
        current.zoomTo();
        current.zoom(openingZoom(structure));
      } else {
        current.setView(view);
      }
      current.render();
    };
    draw.current();
  }, [structure, labels, picked, onPick]);

  useEffect(() => {
    const element = frame.current;
    if (element === null) return undefined;
    if (!hasWebGl()) {
      onUnable();
      return undefined;
    }
    let left = false;
    const redraw = () => draw.current();
    const themes = new MutationObserver(redraw);
    const device = window.matchMedia('(prefers-color-scheme: dark)');
    const sizes = new ResizeObserver(() => viewer.current?.resize());
    const start = async () => {
      const { createViewer } = await import('3dmol');
      if (left) return;
      const current = createViewer(element, { antialias: true, disableFog: true });
      if (current === undefined || current === null) {
        onUnable();
        return;
      }
      viewer.current = current;
      draw.current(true);
      const home = current.getView();
      onReady({
        rotate: (degrees, axis) => current.rotate(degrees, axis),
        zoom: (factor) => current.zoom(factor),
        reset: () => {
          current.setView(home);
          current.render();
        },
        png: () => current.pngURI(),
      });
      themes.observe(document.documentElement, { attributes: true, attributeFilter: ['class'] });
      device.addEventListener('change', redraw);
      sizes.observe(element);
    };
    start().catch((error: unknown) => {
      console.error('The 3D viewer could not start.', error);
      onUnable();
    });
    return () => {
      left = true;
      themes.disconnect();
      sizes.disconnect();
      device.removeEventListener('change', redraw);
      viewer.current = null;
      onReady(null);
      element.replaceChildren();
    };
  }, [onReady, onUnable]);

  return <div ref={frame} className="absolute inset-0" />;
}
