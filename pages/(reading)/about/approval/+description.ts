export { description }

const description =
  'What happens between a member’s draft and a printed edition: who reads it, what a moderator sees, what can be decided, and why nothing printed is ever changed or lost.'
