import { findJobKey } from '../job-key-pattern';
import type { Section } from '../landmark';
import { words } from '../numbers';
import type { LandmarkMap } from '../program';
import type { NwchemState } from './state';

const MAX_DECK_LINES = 100_000;

/**
 * The echoed input, between two rules of "=". It is looked at for the job key, the titles, the geometry that
 * each task uses and the relativistic method, which nothing else in the output names as clearly.
 */
function readDeck(state: NwchemState): Section {
  let geometry = 'geometry';
  let title: NwchemState['title'] = null;
  let inRelativity = false;
  let lines = 0;
  return {
    exclusive: true,
    take(line) {
      const text = line.text.trim();
      if (text.startsWith('=====') || ++lines > MAX_DECK_LINES) return false;
      const jobKey = findJobKey(text);
      if (jobKey !== null) state.jobKey = { text: jobKey, line };
      const [directive = '', second = '', third = ''] = words(text.toLowerCase());
      if (directive === 'title') {
        const name = text.slice('title'.length).trim().replace(/^"/, '').replace(/"$/, '').trim();
        title = name === '' ? null : { text: name, line };
      } else if (directive === 'set' && second === 'geometry') {
        geometry = words(text)[2]?.replaceAll('"', '') ?? geometry;
      } else if (directive === 'task') {
        state.taskGeometries.push(geometry);
        state.taskTitles.push(title);
      } else if (directive === 'relativistic') inRelativity = true;
      else if (directive === 'end') inRelativity = false;
      else if (
        inRelativity &&
        /^(?:zora|douglas-kroll|dyall-mod-dirac|x2c)$/.test(directive) &&
        second !== 'off'
      )
        state.relativity = { text: (third ? `${directive} ${third}` : directive).toUpperCase(), line };
      return true;
    },
  };
}

/** The title: a line of text with a rule of its own length under it, and a blank line above. */
function readTitle(state: NwchemState): Section {
  let lines = 0;
  let above = '-';
  let before = '-';
  return {
    take(line) {
      const rule = line.text.trim();
      const title = above.trim();
      if (
        /^-+$/.test(rule) &&
        title !== '' &&
        rule.length === title.length &&
        before.trim() === '' &&
        !title.startsWith('Basis "') &&
        !/^\S{1,20} \([A-Z][a-z]{1,20}\)$/.test(title) // "Fe (Iron)" heads the basis of an element
      ) {
        state.title = { text: title, line };
        state.jobKey = keyIn(title, line, state.jobKey);
        return false;
      }
      before = above;
      above = line.text;
      return ++lines < 60 && !rule.startsWith('Scaling coordinates');
    },
  };
}

function keyIn(title: string, line: { text: string; number: number }, known: NwchemState['jobKey']) {
  const key = findJobKey(title);
  return key === null ? known : { text: key, line };
}

export const deckLandmarks: LandmarkMap<NwchemState> = {
  '============================== echo of input deck': (_, state) => readDeck(state),
  'NWChem Input Module': (_, state) => readTitle(state),
};
