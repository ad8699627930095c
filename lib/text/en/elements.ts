// What the pieces of an aircraft are called when their maker gave them no name.

export const elements = {
  numbered: '{name} {number}',
  roles: {
    wing: 'Wing',
    foreplane: 'Foreplane',
    tailplane: 'Tailplane',
    fin: 'Fin',
    vtail: 'V-tail',
    tipFin: 'Tip fin',
  },
  bodies: { box: 'Body', profile: 'Profile body', nacelle: 'Nacelle' },
  boom: 'Boom',
  drives: { propeller: 'Motor', ductedFan: 'Ducted fan' },
  items: {
    pack: 'Pack',
    controller: 'Controller',
    servo: 'Servo',
    receiver: 'Receiver',
    ballast: 'Ballast',
    hardware: 'Hardware',
    other: 'Item',
  },
  gear: { wheel: 'Wheel', skid: 'Skid', keel: 'Keel', towHook: 'Tow hook' },
  controls: {
    aileron: 'Aileron',
    elevator: 'Elevator',
    elevon: 'Elevon',
    flaperon: 'Flaperon',
    rudder: 'Rudder',
    ruddervator: 'Ruddervator',
    flap: 'Flap',
    airbrake: 'Airbrake',
    allMoving: 'All-moving surface',
  },
} as const;

/** Sheets by what they are. */
export const materials = {
  paperFacedBoard: 'paper-faced board',
  xps: 'extruded polystyrene',
  epp: 'EPP',
  balsa: 'balsa',
  ply: 'ply',
} as const;
