import type { SectionInput } from '../case/caseFile';
import type { CaseFact, Say } from './caseFacts';

/** What can differ of a section, one fact each. */
export function factsOfSection(section: SectionInput, say: Say): CaseFact[] {
  const { id, chainage, points, roughness, banks, storage, embankments } = section;
  const part = `Section ${id}`;
  const lowest = Math.min(...points.map(([, z]) => z));
  const facts: CaseFact[] = [
    { part, what: 'chainage', text: say(chainage, 'chainage'), exact: chainage },
    {
      part,
      what: 'shape',
      text: `${points.length} points, lowest ${say(lowest, 'elevation')}`,
      exact: points,
    },
    {
      part,
      what: 'Manning’s n',
      text: roughness.map(([, n]) => String(n)).join(', '),
      exact: roughness,
    },
  ];
  if (banks)
    facts.push({
      part,
      what: 'banks',
      text: banks.map((bank) => say(bank, 'length')).join(' and '),
      exact: banks,
    });
  if (storage?.length)
    facts.push({ part, what: 'storage parts', text: String(storage.length), exact: storage });
  if (embankments)
    facts.push({
      part,
      what: 'embankments',
      text: Object.entries(embankments)
        .map(([side, bank]) => `${side} ${say(bank.crest, 'elevation')}`)
        .join(', '),
      exact: embankments,
    });
  return facts;
}
