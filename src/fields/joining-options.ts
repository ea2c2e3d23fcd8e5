/** Choices of how and from where a hub is joined, for every panel that offers them. */
export const JOINING_METHODS = [
  { value: 'heat-hub', label: 'heat the hub' },
  { value: 'cool-shaft', label: 'cool the shaft' },
  { value: 'heat-and-cool', label: 'heat hub, cool shaft' },
  { value: 'press', label: 'press on cold' },
]
export const JOINING_SIDES = [
  { value: 'left', label: 'from the left' },
  { value: 'right', label: 'from the right' },
]
