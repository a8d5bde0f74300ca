/** The version that cells, review sheets and traces state; package.json and manifest.xml say the same (tested). */
export const version = "0.1.0";
