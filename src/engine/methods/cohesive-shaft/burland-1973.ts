import { cite, practice } from '../../sources/bibliography.ts'
import { formula } from '../../trace/formula.ts'
import type { ShaftMethod } from '../method.ts'

export const burlandBeta = formula({
  symbol: 'beta',
  name: 'shaft factor',
  unit: '1',
  text: '(1 - sin(phi)) * tan(phi) * OCR^0.5',
  where: { phi: 'deg', OCR: '1' },
  source: cite('burland-1973', 'effective stress approach'),
})
export const betaShaft = formula({
  symbol: 'f',
  name: 'unit shaft resistance',
  unit: 'kPa',
  text: 'beta * sigma_v',
  where: { beta: '1', sigma_v: 'kPa' },
  source: practice('effective stress (beta) method'),
})

/** Drained shaft resistance from the effective friction angle. */
export const burland1973: ShaftMethod = {
  id: 'burland-1973',
  kind: 'cohesive-shaft',
  title: 'Burland (1973), effective stress',
  installations: ['driven', 'bored', 'continuous-flight-auger'],
  needs: ['effectiveFrictionAngle'],
  parameters: {},
  formulas: [burlandBeta, betaShaft],
  validity: 'Drained conditions in clay.',
  source: 'burland-1973',
  unitShaftResistance: (at) => {
    const phi = at.parameter('effectiveFrictionAngle', 'phi', 'deg')
    const given = at.layer.soil === 'cohesive' && at.layer.overconsolidationRatio !== undefined
    const OCR = given
      ? at.parameter('overconsolidationRatio', 'OCR', '1')
      : at.sheet.assumed(
          { symbol: 'OCR', name: 'overconsolidation ratio', unit: '1' },
          1,
          'no overconsolidationRatio was given: normally consolidated, the lower value',
          practice('normally consolidated'),
        )
    return at.sheet.step(betaShaft, { beta: at.sheet.step(burlandBeta, { phi, OCR }), sigma_v: at.effectiveStress() })
  },
}
