/** Tests call actions and pages outside a server, where nothing is cached. */
export const revalidatePath = (): void => {};
