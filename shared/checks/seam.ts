import type { Check } from './context';

/** Alternating tabs meet themselves at the seam only when the number of staves is even. */
export const seam: Check = ({ layout }) => {
  const { staves } = layout.shell;
  const clash = layout.joint.scheme === 'alternating' && staves % 2 === 1;
  const scheme = layout.joint.scheme === 'alternating' ? 'alternate' : 'run one way';
  return {
    key: 'seam',
    result: clash ? 'stop' : 'clear',
    station: 'shell',
    title: 'Seam',
    figure: { value: staves, kind: 'count' },
    limit: null,
    finding: clash
      ? `Tabs alternate, but ${staves} staves are odd: at the seam tab would meet tab.`
      : `Tabs ${scheme} and meet sockets at the seam of ${staves} staves.`,
    reason: 'The last stave closes against the first: a tab must find a socket there.',
    remedy: clash ? 'Take one stave more or less, or let the tabs run one way.' : '',
  };
};
