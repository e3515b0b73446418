import { type Grant, mayAnywhere } from '@windrow/ventilation/permissions/permissions';

export type NavLinkTo = { to: string; label: string };

/** The parts of Windrow that these grants open. Hiding is a courtesy; the server refuses on its own. */
export function navLinks({
  grants,
  unitId,
}: {
  grants: readonly Grant[];
  unitId: string | null;
}): NavLinkTo[] {
  const inUnit = (to: string) => (unitId === null ? null : `${to}/${unitId}`);
  const links = [
    { to: inUnit('/round'), label: 'Round', isOpen: mayAnywhere(grants, 'see-people') },
    { to: inUnit('/assignment'), label: 'Assignment', isOpen: mayAnywhere(grants, 'see-shifts') },
    { to: '/capacity', label: 'Capacity', isOpen: mayAnywhere(grants, 'see-capacity') },
    {
      to: '/setup',
      label: 'Setup',
      isOpen: mayAnywhere(grants, 'set-up') || mayAnywhere(grants, 'set-policy'),
    },
  ];
  return links.flatMap(({ to, label, isOpen }) => (isOpen && to !== null ? [{ to, label }] : []));
}
