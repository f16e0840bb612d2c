/** Where the work can hurt someone, who decides, and what this letter is not. */
export const FR_CAUTIONS = {
  'cautions.heading': 'À quoi faut-il faire attention avant les travaux\u202f?',
  'cautions.answer': 'Laissez le travail sur les toits, les câbles et les arbres à des gens formés.',
  'cautions.roof': 'Toit et échelle',
  'cautions.roof-fall':
    'Une chute d’un toit ou d’une échelle peut tuer. Ne montez que si vous avez la formation et une protection contre les chutes.',
  'cautions.roof-wet':
    'N’allez pas sur un toit mouillé, gelé ou fragile. Les fenêtres de toit et les plaques minces peuvent casser sous vos pieds.',
  'cautions.roof-lines': 'Tenez les échelles, les perches et les branches très loin des lignes électriques.',
  'cautions.power': 'Électricité',
  'cautions.power-light':
    'Les panneaux solaires sont sous tension tant qu’ils reçoivent de la lumière. Ils peuvent donner une décharge mortelle.',
  'cautions.power-licensed': 'Seul un électricien qualifié et habilité peut les raccorder.',
  'cautions.sun': 'Vos yeux',
  'cautions.sun-look':
    'Ne regardez jamais le soleil, et ne pointez jamais un téléphone vers lui pour regarder à travers.',
  'cautions.codes':
    'Les règles et les lois de l’endroit où vous vivez passent avant tout. L’avis des professionnels agréés aussi. S’ils disent autre chose que cette lettre, suivez-les.',
  'cautions.not':
    'Cette lettre parle de la lumière du soleil. Elle ne dit pas que le toit peut porter des panneaux. Elle ne dit pas que l’installation électrique convient. Des professionnels agréés doivent vérifier les deux.',
} as const;
