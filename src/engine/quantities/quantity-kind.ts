import type { UnitCode } from './units.ts'

const kinds: Readonly<Record<UnitCode, string>> = {
  '1': 'ratio',
  m: 'length',
  m2: 'area',
  m3: 'volume',
  m4: 'second moment of area',
  mm: 'length',
  '1/m': 'reciprocal length',
  kN: 'force',
  kPa: 'stress',
  'kN/m': 'stiffness',
  'kN/m3': 'unit weight',
  'kN.m': 'moment',
  'kN.m/rad': 'rotational stiffness',
  'rad/(kN.m)': 'rotational flexibility',
  'm/kN': 'flexibility',
  '1/kN': 'coupled flexibility',
  'kN/rad': 'coupled stiffness',
  deg: 'angle',
  rad: 'angle',
}

/** What a unit measures, in words. */
export const quantityKind = (unit: UnitCode): string => kinds[unit]
