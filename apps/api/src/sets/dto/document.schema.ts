/** The set document as the API describes it; its own schema stands in the geometry library. */
export const documentSchema = {
  type: 'object' as const,
  additionalProperties: true,
  description: 'SetDocument of the geometry library',
};
