/**
 * What can hurt in an old set and the usual caution, shown wherever work on the set is shown.
 * The product states the caution and defers to local codes and licensed practice (general electrical safety
 * knowledge of the trade; common practice, no source).
 */
export const HAZARDS = [
  'high-voltage',
  'stored-charge',
  'hot-chassis',
  'mains-cord',
  'picture-tube',
  'asbestos',
  'lead',
  'spring-motor',
] as const;
export type Hazard = (typeof HAZARDS)[number];

export interface Caution {
  readonly label: string;
  /** Title where a voltage is on record: `Lethal voltage: 385 V`. */
  readonly title: string;
  readonly whatToDo: string;
}

export const CAUTIONS: Readonly<Record<Hazard, Caution>> = {
  'high-voltage': {
    label: 'High voltage',
    title: 'Lethal voltage in this set',
    whatToDo: 'Work unplugged. Live measurements only by those trained for them, one hand clear of the chassis.',
  },
  'stored-charge': {
    label: 'Stored charge',
    title: 'Charge held after switch-off',
    whatToDo: 'Discharge each filter capacitor through a resistor and measure zero before touching anything.',
  },
  'hot-chassis': {
    label: 'Hot chassis (AC/DC set)',
    title: 'Chassis joined to the supply',
    whatToDo:
      'No isolation inside. Power only through an isolation transformer; never touch chassis, screws or shafts live.',
  },
  'mains-cord': {
    label: 'Original supply cord',
    title: 'Supply cord past use',
    whatToDo: 'Do not plug in. Replace cord and plug and add the fuse before first power, as local codes require.',
  },
  'picture-tube': {
    label: 'Picture tube',
    title: 'Picture tube: implosion and anode charge',
    whatToDo:
      'Face shield and gloves. Discharge the anode to its ground twice before handling; never lift by the neck.',
  },
  asbestos: {
    label: 'Asbestos',
    title: 'Asbestos may be present',
    whatToDo:
      'Do not brush, cut or blow out heat linings and paper. Have it tested and removed as local rules require.',
  },
  lead: {
    label: 'Lead',
    title: 'Lead in solder or finish',
    whatToDo: 'No dry sanding; wet methods, gloves, extraction. Wash hands; keep food out of the workshop.',
  },
  'spring-motor': {
    label: 'Wound spring motor',
    title: 'Mainspring under tension',
    whatToDo: 'Let the motor run right down before opening; never open a spring barrel without the proper holder.',
  },
};

/** Printed once under every list of cautions. */
export const CAUTION_LIMITS =
  'These are the usual cautions, not a safety assessment. Local codes and licensed practice come first.';
