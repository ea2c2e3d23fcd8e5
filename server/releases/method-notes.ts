/**
 * What stood behind the numbers at freezing, in words for the sheet. Stored with each release, so
 * that a later engine never puts its own method under older numbers.
 */
import type { MethodNotes } from '@shared/protocol/releases'

export const METHOD_NOTES: MethodNotes = {
  method: [
    {
      title: 'Limits of size',
      text: 'Tolerance classes give deviations from the tables of ISO 286; interference is diametral, seat less bore, both at 20 °C. Fits given by limits are used as entered.',
    },
    {
      title: 'Embedding',
      text: 'Joining flattens the surfaces: 0.8 times the sum of both roughness depths Rz is taken off the interference (DIN 7190-1).',
    },
    {
      title: 'Temperature and speed',
      text: 'Different expansion of shaft and hub from 20 °C, and the growth of both as rotating rings, change the interference in each load case.',
    },
    {
      title: 'Pressure',
      text: 'Two elastic thick rings of their own materials in plane stress (Lamé), pressure uniform over the length less both bore chamfers; the shaft may be bored.',
    },
    {
      title: 'Holding',
      text: 'Torque and axial capacity by friction at least interference. Slip safety is the friction force over the resultant of circumferential and axial demand times the application factor.',
    },
    {
      title: 'Stress of the fit',
      text: 'Equivalent stress after von Mises at hub and shaft bore at most interference; brittle hubs by their hoop tension against tensile strength.',
    },
    {
      title: 'Window',
      text: 'The left mark is the least as-made interference that holds with the required safety in the governing load case, the right mark the most that keeps hub and shaft within their stress and joining limits.',
    },
    {
      title: 'Joining',
      text: 'Temperature for the most interference plus the joining clearance; the oven adds the allowance for handling. Press force at most interference with the pressing friction.',
    },
    {
      title: 'Shaft',
      text: 'Stepped beam in two planes on rigid or elastic supports, finite elements; torque by summing what parts take and give. Stress combines bending, torsion, axial force and the stress of the fit.',
    },
    {
      title: 'Fatigue',
      text: 'Reversed bending and steady torsion on the Goodman line, with notch factors at seat edges and shoulders, surface and size factors; unlimited life.',
    },
    {
      title: 'Critical speeds',
      text: 'Lateral natural frequencies of the stepped shaft with the masses of the hubs, without gyroscopic effect; torsional ones of the shaft alone.',
    },
    {
      title: 'Assembly',
      text: 'Every part must reach its seat from an end past the diameters that are in the way; the order is the one in which all of them can.',
    },
  ],
  notCovered: [
    'Pressure peaks at the ends of a hub, and slip that creeps in under rotating bending (fretting).',
    'Plastic yielding of a fit used on purpose, creep and relaxation at high temperature.',
    'Shear deflection and weight of the shaft, radial force and tilting moment on a seat.',
    'Stiffening of the shaft by the hubs, and the stiffness of webs, spokes and uneven hub walls.',
    'Keys, splines, tapers, adhesives and fits with intermediate rings.',
    'Spread of friction, of material values and of temperatures beyond the values entered.',
    'Shock, impact and torsional vibration beyond the application factor; tooth, cam and belt strength.',
    'Housing, bearings beyond slope, lubrication, and the safety of the machine as a whole.',
  ],
}
