export { PASSPHRASE_WORDS }

/** 256 plain words from around the track, so that each is worth eight bits. */
const PASSPHRASE_WORDS = [
  'apron', 'arch', 'awning', 'axle', 'badge', 'ballast', 'banner', 'barrel', 'basket', 'beacon', 'bearing',
  'bench', 'berm', 'blade', 'blanket', 'bleed', 'block', 'board', 'bolt', 'boost', 'bottle', 'bracket',
  'brake', 'bridge', 'broom', 'brush', 'bucket', 'bumper', 'bundle', 'button', 'cable', 'canopy', 'carpet',
  'carrier', 'caster', 'chain', 'chalk', 'chassis', 'cheer', 'chisel', 'circuit', 'clamp', 'clip', 'clock',
  'clutch', 'coil', 'collar', 'cone', 'copper', 'corner', 'cradle', 'crate', 'crest', 'crown', 'cushion',
  'damper', 'dash', 'decal', 'diff', 'dirt', 'dome', 'door', 'drift', 'drill', 'drive', 'droop', 'drum',
  'dust', 'engine', 'entry', 'exit', 'fabric', 'fence', 'fender', 'file', 'finish', 'flag', 'flange',
  'flare', 'fleece', 'fluid', 'foam', 'fork', 'frame', 'fuel', 'funnel', 'fuse', 'garage', 'gasket', 'gauge',
  'gear', 'glove', 'gravel', 'grease', 'grid', 'grille', 'grip', 'groove', 'gutter', 'hammer', 'handle',
  'harness', 'hatch', 'heat', 'hedge', 'helmet', 'hinge', 'hollow', 'horn', 'infield', 'inlet', 'insert',
  'jacket', 'joint', 'jump', 'kettle', 'kick', 'knob', 'knuckle', 'ladder', 'lane', 'lantern', 'latch',
  'lever', 'lift', 'limit', 'link', 'loam', 'lock', 'loop', 'magnet', 'mallet', 'marble', 'marker', 'marsh',
  'mast', 'meter', 'mirror', 'motor', 'mount', 'mower', 'nail', 'needle', 'notch', 'nozzle', 'orbit',
  'paddock', 'paint', 'panel', 'parade', 'patch', 'pebble', 'pedal', 'pencil', 'pinion', 'piston', 'pivot',
  'plank', 'plate', 'pliers', 'plug', 'podium', 'polish', 'post', 'puddle', 'pulley', 'pump', 'pylon',
  'quarter', 'rack', 'radio', 'rain', 'rake', 'ramp', 'ratchet', 'rattle', 'relay', 'rhythm', 'ribbon',
  'ridge', 'ring', 'rivet', 'roller', 'rotor', 'rubber', 'rudder', 'runner', 'saddle', 'sand', 'scale',
  'scoop', 'screw', 'sensor', 'shell', 'shim', 'shock', 'siren', 'skid', 'slipper', 'slope', 'socket',
  'spacer', 'spark', 'spindle', 'spoke', 'spring', 'sprint', 'spur', 'stagger', 'stand', 'starter', 'steam',
  'steel', 'sticker', 'stopper', 'strap', 'stripe', 'stud', 'summit', 'sway', 'switch', 'table', 'tape',
  'thumb', 'timber', 'timer', 'tools', 'torque', 'tower', 'track', 'trailer', 'tread', 'trigger', 'triple',
  'trophy', 'truck', 'tunnel', 'turbine', 'turf', 'valve', 'vent', 'visor', 'wagon', 'washer', 'wedge',
  'weight', 'wheel', 'willow', 'wing', 'winner', 'wiper', 'wobble', 'wrench', 'yard', 'zigzag', 'zipper',
] as const
