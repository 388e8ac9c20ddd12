export { standardGravity }

/** Standard acceleration of free fall in m/s² (3rd General Conference on Weights and Measures, 1901). */
const standardGravity = 9.80665
