/** The values of a centre that have a card and may not apply; each is a key of `CentreDescription`. */
export const indexKeys = [
  'meanDistanceAngstrom',
  'baurDistortion',
  'meanSquareDistortion',
  'tau4',
  'tau4Prime',
  'tau5',
  'sigmaDegrees',
  'thetaDegrees',
  'angleVarianceDegrees2',
  'quadraticElongation',
  'shapes',
  'path',
  'axial',
  'planeDisplacement',
  'chelatePlaneAngleDegrees',
  'bondValenceSum',
  'ionicRadiusSums',
] as const;
export type IndexKey = (typeof indexKeys)[number];
