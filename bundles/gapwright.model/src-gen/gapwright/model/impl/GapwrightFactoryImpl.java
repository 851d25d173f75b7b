/**
 */
package gapwright.model.impl;

import gapwright.model.*;

import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;

import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EDataType;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EPackage;

import org.eclipse.emf.ecore.impl.EFactoryImpl;

import org.eclipse.emf.ecore.plugin.EcorePlugin;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model <b>Factory</b>.
 * <!-- end-user-doc -->
 * @generated
 */
public class GapwrightFactoryImpl extends EFactoryImpl implements GapwrightFactory {
	/**
	 * Creates the default factory implementation.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public static GapwrightFactory init() {
		try {
			GapwrightFactory theGapwrightFactory = (GapwrightFactory)EPackage.Registry.INSTANCE.getEFactory(GapwrightPackage.eNS_URI);
			if (theGapwrightFactory != null) {
				return theGapwrightFactory;
			}
		}
		catch (Exception exception) {
			EcorePlugin.INSTANCE.log(exception);
		}
		return new GapwrightFactoryImpl();
	}

	/**
	 * Creates an instance of the factory.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public GapwrightFactoryImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EObject create(EClass eClass) {
		switch (eClass.getClassifierID()) {
			case GapwrightPackage.DESIGN: return createDesign();
			case GapwrightPackage.JOINT: return createJoint();
			case GapwrightPackage.LEG: return createLeg();
			case GapwrightPackage.GAP: return createGap();
			case GapwrightPackage.MAGNET: return createMagnet();
			case GapwrightPackage.AIR_PATH: return createAirPath();
			case GapwrightPackage.WINDING: return createWinding();
			case GapwrightPackage.COIL: return createCoil();
			case GapwrightPackage.MATERIAL: return createMaterial();
			case GapwrightPackage.LINEAR_CURVE: return createLinearCurve();
			case GapwrightPackage.KNEE_CURVE: return createKneeCurve();
			case GapwrightPackage.ARCTAN_CURVE: return createArctanCurve();
			case GapwrightPackage.TABLE_CURVE: return createTableCurve();
			case GapwrightPackage.CURVE_POINT: return createCurvePoint();
			case GapwrightPackage.ROLL_OFF_CURVE: return createRollOffCurve();
			case GapwrightPackage.SATURATION: return createSaturation();
			case GapwrightPackage.CURVE_AT_TEMPERATURE: return createCurveAtTemperature();
			case GapwrightPackage.INITIAL_PERMEABILITY: return createInitialPermeability();
			case GapwrightPackage.STEINMETZ_LOSS: return createSteinmetzLoss();
			case GapwrightPackage.OPERATING_POINT: return createOperatingPoint();
			case GapwrightPackage.CURRENT_DRIVE: return createCurrentDrive();
			case GapwrightPackage.VOLTAGE_DRIVE: return createVoltageDrive();
			case GapwrightPackage.LIMITS: return createLimits();
			case GapwrightPackage.WINDING_LEAKAGE: return createWindingLeakage();
			case GapwrightPackage.WINDING_CONNECTION: return createWindingConnection();
			case GapwrightPackage.CONNECTED_WINDING: return createConnectedWinding();
			case GapwrightPackage.TOLERANCE: return createTolerance();
			default:
				throw new IllegalArgumentException("The class '" + eClass.getName() + "' is not a valid classifier");
		}
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object createFromString(EDataType eDataType, String initialValue) {
		switch (eDataType.getClassifierID()) {
			case GapwrightPackage.SECTION_SHAPE:
				return createSectionShapeFromString(eDataType, initialValue);
			case GapwrightPackage.FRINGING:
				return createFringingFromString(eDataType, initialValue);
			case GapwrightPackage.GAP_PLACE:
				return createGapPlaceFromString(eDataType, initialValue);
			case GapwrightPackage.CURVE_SCALING:
				return createCurveScalingFromString(eDataType, initialValue);
			case GapwrightPackage.VOLTAGE_WAVEFORM:
				return createVoltageWaveformFromString(eDataType, initialValue);
			case GapwrightPackage.WINDING_ARRANGEMENT:
				return createWindingArrangementFromString(eDataType, initialValue);
			case GapwrightPackage.CONNECTION_KIND:
				return createConnectionKindFromString(eDataType, initialValue);
			case GapwrightPackage.TOLERANCED_FEATURE:
				return createTolerancedFeatureFromString(eDataType, initialValue);
			case GapwrightPackage.DISTRIBUTION:
				return createDistributionFromString(eDataType, initialValue);
			case GapwrightPackage.LENGTH:
				return createLengthFromString(eDataType, initialValue);
			case GapwrightPackage.AREA:
				return createAreaFromString(eDataType, initialValue);
			case GapwrightPackage.FLUX_DENSITY:
				return createFluxDensityFromString(eDataType, initialValue);
			case GapwrightPackage.FIELD_STRENGTH:
				return createFieldStrengthFromString(eDataType, initialValue);
			case GapwrightPackage.CURRENT:
				return createCurrentFromString(eDataType, initialValue);
			case GapwrightPackage.VOLTAGE:
				return createVoltageFromString(eDataType, initialValue);
			case GapwrightPackage.TIME:
				return createTimeFromString(eDataType, initialValue);
			case GapwrightPackage.TEMPERATURE:
				return createTemperatureFromString(eDataType, initialValue);
			case GapwrightPackage.FREQUENCY:
				return createFrequencyFromString(eDataType, initialValue);
			case GapwrightPackage.RESISTANCE:
				return createResistanceFromString(eDataType, initialValue);
			case GapwrightPackage.PERMEANCE:
				return createPermeanceFromString(eDataType, initialValue);
			case GapwrightPackage.DENSITY:
				return createDensityFromString(eDataType, initialValue);
			case GapwrightPackage.WIRE:
				return createWireFromString(eDataType, initialValue);
			case GapwrightPackage.DEVIATION:
				return createDeviationFromString(eDataType, initialValue);
			default:
				throw new IllegalArgumentException("The datatype '" + eDataType.getName() + "' is not a valid classifier");
		}
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String convertToString(EDataType eDataType, Object instanceValue) {
		switch (eDataType.getClassifierID()) {
			case GapwrightPackage.SECTION_SHAPE:
				return convertSectionShapeToString(eDataType, instanceValue);
			case GapwrightPackage.FRINGING:
				return convertFringingToString(eDataType, instanceValue);
			case GapwrightPackage.GAP_PLACE:
				return convertGapPlaceToString(eDataType, instanceValue);
			case GapwrightPackage.CURVE_SCALING:
				return convertCurveScalingToString(eDataType, instanceValue);
			case GapwrightPackage.VOLTAGE_WAVEFORM:
				return convertVoltageWaveformToString(eDataType, instanceValue);
			case GapwrightPackage.WINDING_ARRANGEMENT:
				return convertWindingArrangementToString(eDataType, instanceValue);
			case GapwrightPackage.CONNECTION_KIND:
				return convertConnectionKindToString(eDataType, instanceValue);
			case GapwrightPackage.TOLERANCED_FEATURE:
				return convertTolerancedFeatureToString(eDataType, instanceValue);
			case GapwrightPackage.DISTRIBUTION:
				return convertDistributionToString(eDataType, instanceValue);
			case GapwrightPackage.LENGTH:
				return convertLengthToString(eDataType, instanceValue);
			case GapwrightPackage.AREA:
				return convertAreaToString(eDataType, instanceValue);
			case GapwrightPackage.FLUX_DENSITY:
				return convertFluxDensityToString(eDataType, instanceValue);
			case GapwrightPackage.FIELD_STRENGTH:
				return convertFieldStrengthToString(eDataType, instanceValue);
			case GapwrightPackage.CURRENT:
				return convertCurrentToString(eDataType, instanceValue);
			case GapwrightPackage.VOLTAGE:
				return convertVoltageToString(eDataType, instanceValue);
			case GapwrightPackage.TIME:
				return convertTimeToString(eDataType, instanceValue);
			case GapwrightPackage.TEMPERATURE:
				return convertTemperatureToString(eDataType, instanceValue);
			case GapwrightPackage.FREQUENCY:
				return convertFrequencyToString(eDataType, instanceValue);
			case GapwrightPackage.RESISTANCE:
				return convertResistanceToString(eDataType, instanceValue);
			case GapwrightPackage.PERMEANCE:
				return convertPermeanceToString(eDataType, instanceValue);
			case GapwrightPackage.DENSITY:
				return convertDensityToString(eDataType, instanceValue);
			case GapwrightPackage.WIRE:
				return convertWireToString(eDataType, instanceValue);
			case GapwrightPackage.DEVIATION:
				return convertDeviationToString(eDataType, instanceValue);
			default:
				throw new IllegalArgumentException("The datatype '" + eDataType.getName() + "' is not a valid classifier");
		}
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Design createDesign() {
		DesignImpl design = new DesignImpl();
		return design;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Joint createJoint() {
		JointImpl joint = new JointImpl();
		return joint;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Leg createLeg() {
		LegImpl leg = new LegImpl();
		return leg;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Gap createGap() {
		GapImpl gap = new GapImpl();
		return gap;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Magnet createMagnet() {
		MagnetImpl magnet = new MagnetImpl();
		return magnet;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public AirPath createAirPath() {
		AirPathImpl airPath = new AirPathImpl();
		return airPath;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Winding createWinding() {
		WindingImpl winding = new WindingImpl();
		return winding;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Coil createCoil() {
		CoilImpl coil = new CoilImpl();
		return coil;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Material createMaterial() {
		MaterialImpl material = new MaterialImpl();
		return material;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public LinearCurve createLinearCurve() {
		LinearCurveImpl linearCurve = new LinearCurveImpl();
		return linearCurve;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public KneeCurve createKneeCurve() {
		KneeCurveImpl kneeCurve = new KneeCurveImpl();
		return kneeCurve;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public ArctanCurve createArctanCurve() {
		ArctanCurveImpl arctanCurve = new ArctanCurveImpl();
		return arctanCurve;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public TableCurve createTableCurve() {
		TableCurveImpl tableCurve = new TableCurveImpl();
		return tableCurve;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public CurvePoint createCurvePoint() {
		CurvePointImpl curvePoint = new CurvePointImpl();
		return curvePoint;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public RollOffCurve createRollOffCurve() {
		RollOffCurveImpl rollOffCurve = new RollOffCurveImpl();
		return rollOffCurve;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Saturation createSaturation() {
		SaturationImpl saturation = new SaturationImpl();
		return saturation;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public CurveAtTemperature createCurveAtTemperature() {
		CurveAtTemperatureImpl curveAtTemperature = new CurveAtTemperatureImpl();
		return curveAtTemperature;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public InitialPermeability createInitialPermeability() {
		InitialPermeabilityImpl initialPermeability = new InitialPermeabilityImpl();
		return initialPermeability;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public SteinmetzLoss createSteinmetzLoss() {
		SteinmetzLossImpl steinmetzLoss = new SteinmetzLossImpl();
		return steinmetzLoss;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public OperatingPoint createOperatingPoint() {
		OperatingPointImpl operatingPoint = new OperatingPointImpl();
		return operatingPoint;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public CurrentDrive createCurrentDrive() {
		CurrentDriveImpl currentDrive = new CurrentDriveImpl();
		return currentDrive;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public VoltageDrive createVoltageDrive() {
		VoltageDriveImpl voltageDrive = new VoltageDriveImpl();
		return voltageDrive;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Limits createLimits() {
		LimitsImpl limits = new LimitsImpl();
		return limits;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public WindingLeakage createWindingLeakage() {
		WindingLeakageImpl windingLeakage = new WindingLeakageImpl();
		return windingLeakage;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public WindingConnection createWindingConnection() {
		WindingConnectionImpl windingConnection = new WindingConnectionImpl();
		return windingConnection;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public ConnectedWinding createConnectedWinding() {
		ConnectedWindingImpl connectedWinding = new ConnectedWindingImpl();
		return connectedWinding;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Tolerance createTolerance() {
		ToleranceImpl tolerance = new ToleranceImpl();
		return tolerance;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public SectionShape createSectionShapeFromString(EDataType eDataType, String initialValue) {
		SectionShape result = SectionShape.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertSectionShapeToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Fringing createFringingFromString(EDataType eDataType, String initialValue) {
		Fringing result = Fringing.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertFringingToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public GapPlace createGapPlaceFromString(EDataType eDataType, String initialValue) {
		GapPlace result = GapPlace.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertGapPlaceToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public CurveScaling createCurveScalingFromString(EDataType eDataType, String initialValue) {
		CurveScaling result = CurveScaling.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertCurveScalingToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public VoltageWaveform createVoltageWaveformFromString(EDataType eDataType, String initialValue) {
		VoltageWaveform result = VoltageWaveform.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertVoltageWaveformToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public WindingArrangement createWindingArrangementFromString(EDataType eDataType, String initialValue) {
		WindingArrangement result = WindingArrangement.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertWindingArrangementToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public ConnectionKind createConnectionKindFromString(EDataType eDataType, String initialValue) {
		ConnectionKind result = ConnectionKind.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertConnectionKindToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public TolerancedFeature createTolerancedFeatureFromString(EDataType eDataType, String initialValue) {
		TolerancedFeature result = TolerancedFeature.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertTolerancedFeatureToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Distribution createDistributionFromString(EDataType eDataType, String initialValue) {
		Distribution result = Distribution.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertDistributionToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createLength(final String it) {
		return it == null ? null : Quantity.parse(it, Dimension.LENGTH);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createLengthFromString(EDataType eDataType, String initialValue) {
		return createLength(initialValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertLength(final Quantity it) {
		return it == null ? null : it.text();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertLengthToString(EDataType eDataType, Object instanceValue) {
		return convertLength((Quantity)instanceValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createArea(final String it) {
		return it == null ? null : Quantity.parse(it, Dimension.AREA);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createAreaFromString(EDataType eDataType, String initialValue) {
		return createArea(initialValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertArea(final Quantity it) {
		return it == null ? null : it.text();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertAreaToString(EDataType eDataType, Object instanceValue) {
		return convertArea((Quantity)instanceValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createFluxDensity(final String it) {
		return it == null ? null : Quantity.parse(it, Dimension.FLUX_DENSITY);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createFluxDensityFromString(EDataType eDataType, String initialValue) {
		return createFluxDensity(initialValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertFluxDensity(final Quantity it) {
		return it == null ? null : it.text();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertFluxDensityToString(EDataType eDataType, Object instanceValue) {
		return convertFluxDensity((Quantity)instanceValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createFieldStrength(final String it) {
		return it == null ? null : Quantity.parse(it, Dimension.FIELD_STRENGTH);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createFieldStrengthFromString(EDataType eDataType, String initialValue) {
		return createFieldStrength(initialValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertFieldStrength(final Quantity it) {
		return it == null ? null : it.text();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertFieldStrengthToString(EDataType eDataType, Object instanceValue) {
		return convertFieldStrength((Quantity)instanceValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createCurrent(final String it) {
		return it == null ? null : Quantity.parse(it, Dimension.CURRENT);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createCurrentFromString(EDataType eDataType, String initialValue) {
		return createCurrent(initialValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertCurrent(final Quantity it) {
		return it == null ? null : it.text();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertCurrentToString(EDataType eDataType, Object instanceValue) {
		return convertCurrent((Quantity)instanceValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createVoltage(final String it) {
		return it == null ? null : Quantity.parse(it, Dimension.VOLTAGE);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createVoltageFromString(EDataType eDataType, String initialValue) {
		return createVoltage(initialValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertVoltage(final Quantity it) {
		return it == null ? null : it.text();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertVoltageToString(EDataType eDataType, Object instanceValue) {
		return convertVoltage((Quantity)instanceValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createTime(final String it) {
		return it == null ? null : Quantity.parse(it, Dimension.TIME);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createTimeFromString(EDataType eDataType, String initialValue) {
		return createTime(initialValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertTime(final Quantity it) {
		return it == null ? null : it.text();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertTimeToString(EDataType eDataType, Object instanceValue) {
		return convertTime((Quantity)instanceValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createTemperature(final String it) {
		return it == null ? null : Quantity.parse(it, Dimension.TEMPERATURE);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createTemperatureFromString(EDataType eDataType, String initialValue) {
		return createTemperature(initialValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertTemperature(final Quantity it) {
		return it == null ? null : it.text();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertTemperatureToString(EDataType eDataType, Object instanceValue) {
		return convertTemperature((Quantity)instanceValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createFrequency(final String it) {
		return it == null ? null : Quantity.parse(it, Dimension.FREQUENCY);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createFrequencyFromString(EDataType eDataType, String initialValue) {
		return createFrequency(initialValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertFrequency(final Quantity it) {
		return it == null ? null : it.text();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertFrequencyToString(EDataType eDataType, Object instanceValue) {
		return convertFrequency((Quantity)instanceValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createResistance(final String it) {
		return it == null ? null : Quantity.parse(it, Dimension.RESISTANCE);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createResistanceFromString(EDataType eDataType, String initialValue) {
		return createResistance(initialValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertResistance(final Quantity it) {
		return it == null ? null : it.text();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertResistanceToString(EDataType eDataType, Object instanceValue) {
		return convertResistance((Quantity)instanceValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createPermeance(final String it) {
		return it == null ? null : Quantity.parse(it, Dimension.PERMEANCE);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createPermeanceFromString(EDataType eDataType, String initialValue) {
		return createPermeance(initialValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertPermeance(final Quantity it) {
		return it == null ? null : it.text();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertPermeanceToString(EDataType eDataType, Object instanceValue) {
		return convertPermeance((Quantity)instanceValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createDensity(final String it) {
		return it == null ? null : Quantity.parse(it, Dimension.DENSITY);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createDensityFromString(EDataType eDataType, String initialValue) {
		return createDensity(initialValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertDensity(final Quantity it) {
		return it == null ? null : it.text();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertDensityToString(EDataType eDataType, Object instanceValue) {
		return convertDensity((Quantity)instanceValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createWire(final String it) {
		return it == null ? null : Quantity.parse(it, Dimension.WIRE);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createWireFromString(EDataType eDataType, String initialValue) {
		return createWire(initialValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertWire(final Quantity it) {
		return it == null ? null : it.text();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertWireToString(EDataType eDataType, Object instanceValue) {
		return convertWire((Quantity)instanceValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createDeviation(final String it) {
		return it == null ? null : Quantity.parse(it, Dimension.DEVIATION);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Quantity createDeviationFromString(EDataType eDataType, String initialValue) {
		return createDeviation(initialValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertDeviation(final Quantity it) {
		return it == null ? null : it.text();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertDeviationToString(EDataType eDataType, Object instanceValue) {
		return convertDeviation((Quantity)instanceValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public GapwrightPackage getGapwrightPackage() {
		return (GapwrightPackage)getEPackage();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @deprecated
	 * @generated
	 */
	@Deprecated
	public static GapwrightPackage getPackage() {
		return GapwrightPackage.eINSTANCE;
	}

} //GapwrightFactoryImpl
