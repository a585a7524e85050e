import type { Commission } from '@shared/api/commission';

/** A commission as the API gives it, with whatever a test wants different. */
export function commissionWith(parts: Partial<Commission> = {}): Commission {
  return {
    id: '4b1f0c52-5a38-4b0f-9a54-0d6a3f6f2a01',
    layoutId: '4b1f0c52-5a38-4b0f-9a54-0d6a3f6f2a02',
    title: 'Ferry-hall lantern',
    client: 'Harbour Trust',
    due: '2027-03-14',
    stage: 'design',
    archived: false,
    staves: 32,
    courses: 9,
    woods: ['White ash', 'Black walnut'],
    thumbnail: { staves: 2, courses: 1, colours: ['#DCC39A', '#5B3D2A'], cells: btoa('\x00\x01') },
    lastVersion: null,
    updatedAt: '2027-03-01T09:00:00.000Z',
    ...parts,
  };
}
