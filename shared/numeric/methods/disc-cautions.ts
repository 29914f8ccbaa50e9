import { sectionCautions } from './bar-cautions.ts';
import { numberGiven } from './given.ts';
import type { Caution, GivenInputs } from './method.ts';

// Limits of the disc in ASTM C1499, from memory: load ring over support ring, thickness over support ring, overhang in
// thicknesses.
const loadOverSupport = { least: 0.2, most: 0.5 };
const mostThicknessOverSupport = 0.1;
const overhangInThicknesses = { least: 2, most: 12 };

/** Load and proportions of a ring-on-ring disc. */
export function ringOnRingCautions(given: GivenInputs): Caution[] {
  const cautions = sectionCautions(given);
  const [support, load] = [numberGiven(given, 'supportDiameter'), numberGiven(given, 'loadDiameter')];
  const thickness = numberGiven(given, 'thickness');
  const overhang = (numberGiven(given, 'discDiameter') - support) / thickness;
  if (!isWithin(load / support, loadOverSupport)) {
    const { least, most } = loadOverSupport;
    const sentence = `The load ring is not ${least} to ${most} of the support ring (ASTM C1499, from memory).`;
    cautions.push({ code: 'ring-proportion', weight: 'warning', sentence });
  }
  if (thickness / support > mostThicknessOverSupport) {
    const sentence =
      'The disc is thicker than a tenth of the support ring: thin-plate theory is no longer close (ASTM C1499, from memory).';
    cautions.push({ code: 'thick-disc', weight: 'warning', sentence });
  }
  if (!isWithin(overhang, overhangInThicknesses)) {
    const { least, most } = overhangInThicknesses;
    const sentence = `The disc is not ${least} to ${most} thicknesses larger than the support ring (ASTM C1499, from memory).`;
    cautions.push({ code: 'disc-overhang', weight: 'note', sentence });
  }
  return cautions;
}

/** An origin so close to the load ring that contact stress may have taken part: trade practice. */
export function loadRingCautions(given: GivenInputs): Caution[] {
  const fromRing = Math.abs(numberGiven(given, 'radius') - numberGiven(given, 'loadDiameter') / 2);
  if (fromRing >= numberGiven(given, 'thickness')) return [];
  const sentence = 'The origin is within one thickness of the load ring: contact stress may have taken part.';
  return [{ code: 'contact-zone', weight: 'warning', sentence }];
}

/** An origin off the centre of a three-ball test. */
export function offCentreCautions(given: GivenInputs): Caution[] {
  if (numberGiven(given, 'radius') === 0) return [];
  const sentence =
    'Away from the centre this is an estimate: the three balls are taken for a ring, and the pressure under the piston for even.';
  return [{ code: 'off-centre', weight: 'note', sentence }];
}

function isWithin(value: number, { least, most }: { readonly least: number; readonly most: number }): boolean {
  return value >= least && value <= most;
}
