export const lostPage = {
  title: 'No such page',
  text: 'This address has no page in the handbook. A formula that was withdrawn or a sheet from an older edition may have pointed here.',
  advice:
    'Go back to the contents of the handbook and look for the code there. Do not work from an old printout until you have found it.',
} as const;
