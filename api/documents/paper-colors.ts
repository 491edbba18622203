import { type Role } from '@shared/drawings/drawing';

/** The colours of the light scheme, for print. */
export const paperColors: Record<Role, string> = {
  ink: '#12332b',
  soft: '#4b6158',
  line: '#d8ded8',
  glass: '#dcebe5',
  'glass-edge': '#5b8f7e',
  metal: '#8f9a97',
  copper: '#a8541f',
  butyl: '#22302c',
  seal: '#b9c2bd',
  bead: '#c9a777',
  sheet: '#ffffff',
  tint: '#eef4f0',
};
