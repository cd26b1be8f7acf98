/** Version of the program, as findings and records state it; a test keeps it that of `package.json`. */
export const version = "0.1.0";
