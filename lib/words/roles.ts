/** A role as it is called on the screen. */
export const roleNames = {
  builder: 'Builder',
  designer: 'Designer',
  technician: 'Bench technician',
  inspector: 'Inspector',
  instructor: 'Instructor',
  owner: 'Owner',
} as const
