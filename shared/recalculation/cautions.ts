/** Printed on every results page, sheet and export. */
export const CAUTIONS: readonly string[] = [
  'These results support a qualified engineer. They replace neither the applicable codes and standards, nor the manufacturer’s instructions, nor licensed practice.',
  'The formulas are for smooth concentric rings, elastic stress and static or moderately alternating load. Thin webs, holes, splines, keyways in the seat, tapered seats, polymer parts, rolling wheels, pressure vessels, aircraft and lifting parts need their own rules.',
  'Grip depends on friction and on sizes that are not known until measured. Prove the first assembly by torque or push-off.',
  'Not covered: stress peaks at the hub edges, radial force and tilting moment on the seat, creep of aluminium above 100 °C, shear deflection and weight of the shaft, gyroscopic effect.',
  'Hot parts burn and ignite oil. Liquid nitrogen and dry ice cause frostbite and displace air; ventilate. Pressing stores energy: guard the line of the press and stand clear of brittle hubs. Secure loads when lifting. Never hammer a stuck hub.',
]

/** The same in one line, for places that have no room for more. */
export const CAUTIONS_LINE =
  'Results support a qualified engineer; they replace neither the applicable codes nor licensed practice.'
