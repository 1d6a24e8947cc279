import MenuIcon from '@mui/icons-material/Menu';
import Box from '@mui/material/Box';
import Drawer from '@mui/material/Drawer';
import IconButton from '@mui/material/IconButton';
import { useState } from 'react';
import { Outlet, ScrollRestoration } from 'react-router-dom';
import { Brand } from './Brand';
import { HeaderSearch } from './HeaderSearch';
import { PersonMenu } from './PersonMenu';
import { usePrintInLight } from './usePrintInLight';
import { SideNav } from './SideNav';

const NAV_WIDTH = 188;

/** The frame round every signed-in page: navigation at the side, search and person on top. */
export function AppShell() {
  const [drawer, setDrawer] = useState(false);
  usePrintInLight();
  return (
    <Box sx={{ display: 'flex', minHeight: '100dvh' }}>
      <Box component="a" href="#content" sx={skipLink}>
        Skip to the page
      </Box>
      <Box
        sx={{
          display: { xs: 'none', md: 'block' },
          displayPrint: 'none',
          width: NAV_WIDTH,
          flexShrink: 0,
          borderRight: '1px solid',
          borderColor: 'line.rule',
          position: 'sticky',
          top: 0,
          height: '100dvh',
        }}
      >
        <SideNav />
      </Box>
      <Drawer open={drawer} onClose={() => setDrawer(false)} sx={{ display: { md: 'none' } }}>
        <Box sx={{ width: 250, height: '100%', bgcolor: 'background.default' }}>
          <SideNav onGo={() => setDrawer(false)} />
        </Box>
      </Drawer>
      <Box sx={{ flex: 1, minWidth: 0, display: 'flex', flexDirection: 'column' }}>
        <Box component="header" sx={topBar}>
          <IconButton
            aria-label="Open the navigation"
            onClick={() => setDrawer(true)}
            sx={{ display: { md: 'none' }, ml: -1 }}
          >
            <MenuIcon />
          </IconButton>
          <Box sx={{ display: { xs: 'none', sm: 'block', md: 'none' } }}>
            <Brand />
          </Box>
          <HeaderSearch />
          <PersonMenu />
        </Box>
        <Box
          component="main"
          id="content"
          tabIndex={-1}
          sx={{ flex: 1, px: { xs: 2, md: 3 }, pb: 3, pt: 2, minWidth: 0, outline: 'none' }}
        >
          <Outlet />
        </Box>
      </Box>
      <ScrollRestoration />
    </Box>
  );
}

const topBar = {
  displayPrint: 'none',
  position: 'sticky',
  top: 0,
  zIndex: 5,
  height: 52,
  flexShrink: 0,
  px: { xs: 2, md: 3 },
  display: 'flex',
  alignItems: 'center',
  gap: 1.5,
  bgcolor: 'background.default',
  borderBottom: '1px solid',
  borderColor: 'line.rule',
} as const;

const skipLink = {
  displayPrint: 'none',
  position: 'fixed',
  left: 8,
  top: -60,
  zIndex: 20,
  p: 1,
  bgcolor: 'background.paper',
  color: 'text.primary',
  '&:focus': { top: 8 },
} as const;
