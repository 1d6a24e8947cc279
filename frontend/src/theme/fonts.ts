// The whole files: their faces carry unicode ranges, so that Latin text is never looked for in another subset.
import '@fontsource/ibm-plex-sans/400.css';
import '@fontsource/ibm-plex-sans/500.css';
import '@fontsource/ibm-plex-sans/600.css';
