/**
 */
package gapwright.model.impl;

import gapwright.model.AirPath;
import gapwright.model.ArctanCurve;
import gapwright.model.Coil;
import gapwright.model.ConnectedWinding;
import gapwright.model.ConnectionKind;
import gapwright.model.CurrentDrive;
import gapwright.model.Curve;
import gapwright.model.CurveAtTemperature;
import gapwright.model.CurvePoint;
import gapwright.model.CurveScaling;
import gapwright.model.Design;
import gapwright.model.Distribution;
import gapwright.model.Drive;
import gapwright.model.Element;
import gapwright.model.Fringing;
import gapwright.model.Gap;
import gapwright.model.GapPlace;
import gapwright.model.GapwrightFactory;
import gapwright.model.GapwrightPackage;
import gapwright.model.InitialPermeability;
import gapwright.model.Joint;
import gapwright.model.KneeCurve;
import gapwright.model.Leg;
import gapwright.model.Limits;
import gapwright.model.LinearCurve;
import gapwright.model.Magnet;
import gapwright.model.Material;
import gapwright.model.OperatingPoint;
import gapwright.model.RollOffCurve;
import gapwright.model.Saturation;
import gapwright.model.SectionShape;
import gapwright.model.SteinmetzLoss;
import gapwright.model.TableCurve;
import gapwright.model.Tolerance;
import gapwright.model.TolerancedFeature;
import gapwright.model.VoltageDrive;
import gapwright.model.VoltageWaveform;
import gapwright.model.Winding;
import gapwright.model.WindingArrangement;
import gapwright.model.WindingConnection;
import gapwright.model.WindingLeakage;

import gapwright.model.quantity.Quantity;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EDataType;
import org.eclipse.emf.ecore.EEnum;
import org.eclipse.emf.ecore.EPackage;
import org.eclipse.emf.ecore.EReference;

import org.eclipse.emf.ecore.impl.EPackageImpl;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model <b>Package</b>.
 * <!-- end-user-doc -->
 * @generated
 */
public class GapwrightPackageImpl extends EPackageImpl implements GapwrightPackage {
	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass designEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass elementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass jointEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass legEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass gapEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass magnetEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass airPathEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass windingEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass coilEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass materialEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass curveEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass linearCurveEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass kneeCurveEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass arctanCurveEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass tableCurveEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass curvePointEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass rollOffCurveEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass saturationEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass curveAtTemperatureEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass initialPermeabilityEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass steinmetzLossEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass operatingPointEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass driveEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass currentDriveEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass voltageDriveEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass limitsEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass windingLeakageEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass windingConnectionEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass connectedWindingEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass toleranceEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum sectionShapeEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum fringingEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum gapPlaceEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum curveScalingEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum voltageWaveformEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum windingArrangementEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum connectionKindEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum tolerancedFeatureEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum distributionEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EDataType lengthEDataType = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EDataType areaEDataType = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EDataType fluxDensityEDataType = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EDataType fieldStrengthEDataType = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EDataType currentEDataType = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EDataType voltageEDataType = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EDataType timeEDataType = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EDataType temperatureEDataType = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EDataType frequencyEDataType = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EDataType resistanceEDataType = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EDataType permeanceEDataType = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EDataType densityEDataType = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EDataType wireEDataType = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EDataType deviationEDataType = null;

	/**
	 * Creates an instance of the model <b>Package</b>, registered with
	 * {@link org.eclipse.emf.ecore.EPackage.Registry EPackage.Registry} by the package
	 * package URI value.
	 * <p>Note: the correct way to create the package is via the static
	 * factory method {@link #init init()}, which also performs
	 * initialization of the package, or returns the registered package,
	 * if one already exists.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.eclipse.emf.ecore.EPackage.Registry
	 * @see gapwright.model.GapwrightPackage#eNS_URI
	 * @see #init()
	 * @generated
	 */
	private GapwrightPackageImpl() {
		super(eNS_URI, GapwrightFactory.eINSTANCE);
	}
	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private static boolean isInited = false;

	/**
	 * Creates, registers, and initializes the <b>Package</b> for this model, and for any others upon which it depends.
	 *
	 * <p>This method is used to initialize {@link GapwrightPackage#eINSTANCE} when that field is accessed.
	 * Clients should not invoke it directly. Instead, they should simply access that field to obtain the package.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #eNS_URI
	 * @see #createPackageContents()
	 * @see #initializePackageContents()
	 * @generated
	 */
	public static GapwrightPackage init() {
		if (isInited) return (GapwrightPackage)EPackage.Registry.INSTANCE.getEPackage(GapwrightPackage.eNS_URI);

		// Obtain or create and register package
		Object registeredGapwrightPackage = EPackage.Registry.INSTANCE.get(eNS_URI);
		GapwrightPackageImpl theGapwrightPackage = registeredGapwrightPackage instanceof GapwrightPackageImpl ? (GapwrightPackageImpl)registeredGapwrightPackage : new GapwrightPackageImpl();

		isInited = true;

		// Create package meta-data objects
		theGapwrightPackage.createPackageContents();

		// Initialize created meta-data
		theGapwrightPackage.initializePackageContents();

		// Mark meta-data to indicate it can't be changed
		theGapwrightPackage.freeze();

		// Update the registry and return the package
		EPackage.Registry.INSTANCE.put(GapwrightPackage.eNS_URI, theGapwrightPackage);
		return theGapwrightPackage;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getDesign() {
		return designEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getDesign_Name() {
		return (EAttribute)designEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getDesign_Notes() {
		return (EAttribute)designEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getDesign_Materials() {
		return (EReference)designEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getDesign_Joints() {
		return (EReference)designEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getDesign_Legs() {
		return (EReference)designEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getDesign_AirPaths() {
		return (EReference)designEClass.getEStructuralFeatures().get(5);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getDesign_Windings() {
		return (EReference)designEClass.getEStructuralFeatures().get(6);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getDesign_OperatingPoints() {
		return (EReference)designEClass.getEStructuralFeatures().get(7);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getDesign_Limits() {
		return (EReference)designEClass.getEStructuralFeatures().get(8);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getDesign_Leakages() {
		return (EReference)designEClass.getEStructuralFeatures().get(9);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getDesign_Connections() {
		return (EReference)designEClass.getEStructuralFeatures().get(10);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getDesign_Tolerances() {
		return (EReference)designEClass.getEStructuralFeatures().get(11);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getElement() {
		return elementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getElement_Id() {
		return (EAttribute)elementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getElement_Name() {
		return (EAttribute)elementEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getJoint() {
		return jointEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getJoint_X() {
		return (EAttribute)jointEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getJoint_Y() {
		return (EAttribute)jointEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getLeg() {
		return legEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getLeg_From() {
		return (EReference)legEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getLeg_To() {
		return (EReference)legEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getLeg_Material() {
		return (EReference)legEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getLeg_Shape() {
		return (EAttribute)legEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getLeg_Width() {
		return (EAttribute)legEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getLeg_Depth() {
		return (EAttribute)legEClass.getEStructuralFeatures().get(5);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getLeg_Diameter() {
		return (EAttribute)legEClass.getEStructuralFeatures().get(6);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getLeg_Area() {
		return (EAttribute)legEClass.getEStructuralFeatures().get(7);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getLeg_StackingFactor() {
		return (EAttribute)legEClass.getEStructuralFeatures().get(8);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getLeg_PathLength() {
		return (EAttribute)legEClass.getEStructuralFeatures().get(9);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getLeg_Gaps() {
		return (EReference)legEClass.getEStructuralFeatures().get(10);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getLeg_Magnet() {
		return (EReference)legEClass.getEStructuralFeatures().get(11);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getGap() {
		return gapEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGap_Length() {
		return (EAttribute)gapEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGap_Pieces() {
		return (EAttribute)gapEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGap_Fringing() {
		return (EAttribute)gapEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGap_WindowHeight() {
		return (EAttribute)gapEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGap_Position() {
		return (EAttribute)gapEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGap_Place() {
		return (EAttribute)gapEClass.getEStructuralFeatures().get(5);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getMagnet() {
		return magnetEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getMagnet_Length() {
		return (EAttribute)magnetEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getMagnet_Remanence() {
		return (EAttribute)magnetEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getMagnet_RecoilPermeability() {
		return (EAttribute)magnetEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getMagnet_Reversed() {
		return (EAttribute)magnetEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getMagnet_Position() {
		return (EAttribute)magnetEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getAirPath() {
		return airPathEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getAirPath_From() {
		return (EReference)airPathEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getAirPath_To() {
		return (EReference)airPathEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getAirPath_Permeance() {
		return (EAttribute)airPathEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getAirPath_Area() {
		return (EAttribute)airPathEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getAirPath_Length() {
		return (EAttribute)airPathEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getAirPath_Leakage() {
		return (EAttribute)airPathEClass.getEStructuralFeatures().get(5);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getWinding() {
		return windingEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getWinding_Coils() {
		return (EReference)windingEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getWinding_Wire() {
		return (EAttribute)windingEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getWinding_Resistance() {
		return (EAttribute)windingEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getCoil() {
		return coilEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getCoil_Leg() {
		return (EReference)coilEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCoil_Turns() {
		return (EAttribute)coilEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCoil_Reversed() {
		return (EAttribute)coilEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCoil_Position() {
		return (EAttribute)coilEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getMaterial() {
		return materialEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getMaterial_Curve() {
		return (EReference)materialEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getMaterial_Saturations() {
		return (EReference)materialEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getMaterial_Loss() {
		return (EReference)materialEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getMaterial_Density() {
		return (EAttribute)materialEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getMaterial_Source() {
		return (EAttribute)materialEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getMaterial_CurveTemperature() {
		return (EAttribute)materialEClass.getEStructuralFeatures().get(5);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getMaterial_CurveScaling() {
		return (EAttribute)materialEClass.getEStructuralFeatures().get(6);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getMaterial_OtherCurves() {
		return (EReference)materialEClass.getEStructuralFeatures().get(7);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getMaterial_Permeabilities() {
		return (EReference)materialEClass.getEStructuralFeatures().get(8);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getMaterial_CurieTemperature() {
		return (EAttribute)materialEClass.getEStructuralFeatures().get(9);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getCurve() {
		return curveEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getLinearCurve() {
		return linearCurveEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getLinearCurve_RelativePermeability() {
		return (EAttribute)linearCurveEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getKneeCurve() {
		return kneeCurveEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getKneeCurve_InitialPermeability() {
		return (EAttribute)kneeCurveEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getKneeCurve_SaturationPolarisation() {
		return (EAttribute)kneeCurveEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getArctanCurve() {
		return arctanCurveEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getArctanCurve_InitialPermeability() {
		return (EAttribute)arctanCurveEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getArctanCurve_SaturationPolarisation() {
		return (EAttribute)arctanCurveEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getTableCurve() {
		return tableCurveEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getTableCurve_Points() {
		return (EReference)tableCurveEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getCurvePoint() {
		return curvePointEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCurvePoint_FieldStrength() {
		return (EAttribute)curvePointEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCurvePoint_FluxDensity() {
		return (EAttribute)curvePointEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getRollOffCurve() {
		return rollOffCurveEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getRollOffCurve_InitialPermeability() {
		return (EAttribute)rollOffCurveEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getRollOffCurve_HalfFieldStrength() {
		return (EAttribute)rollOffCurveEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getRollOffCurve_Exponent() {
		return (EAttribute)rollOffCurveEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getSaturation() {
		return saturationEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSaturation_Temperature() {
		return (EAttribute)saturationEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSaturation_FluxDensity() {
		return (EAttribute)saturationEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getCurveAtTemperature() {
		return curveAtTemperatureEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCurveAtTemperature_Temperature() {
		return (EAttribute)curveAtTemperatureEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getCurveAtTemperature_Curve() {
		return (EReference)curveAtTemperatureEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getInitialPermeability() {
		return initialPermeabilityEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getInitialPermeability_Temperature() {
		return (EAttribute)initialPermeabilityEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getInitialPermeability_RelativePermeability() {
		return (EAttribute)initialPermeabilityEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getSteinmetzLoss() {
		return steinmetzLossEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSteinmetzLoss_Coefficient() {
		return (EAttribute)steinmetzLossEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSteinmetzLoss_FrequencyExponent() {
		return (EAttribute)steinmetzLossEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSteinmetzLoss_FluxDensityExponent() {
		return (EAttribute)steinmetzLossEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSteinmetzLoss_MinimumFrequency() {
		return (EAttribute)steinmetzLossEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSteinmetzLoss_MaximumFrequency() {
		return (EAttribute)steinmetzLossEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSteinmetzLoss_Temperature() {
		return (EAttribute)steinmetzLossEClass.getEStructuralFeatures().get(5);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getOperatingPoint() {
		return operatingPointEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getOperatingPoint_Temperature() {
		return (EAttribute)operatingPointEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getOperatingPoint_Frequency() {
		return (EAttribute)operatingPointEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getOperatingPoint_Drives() {
		return (EReference)operatingPointEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getDrive() {
		return driveEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getDrive_Winding() {
		return (EReference)driveEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getCurrentDrive() {
		return currentDriveEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCurrentDrive_Current() {
		return (EAttribute)currentDriveEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCurrentDrive_Ripple() {
		return (EAttribute)currentDriveEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getVoltageDrive() {
		return voltageDriveEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getVoltageDrive_Voltage() {
		return (EAttribute)voltageDriveEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getVoltageDrive_OnTime() {
		return (EAttribute)voltageDriveEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getVoltageDrive_Bias() {
		return (EAttribute)voltageDriveEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getVoltageDrive_Waveform() {
		return (EAttribute)voltageDriveEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getLimits() {
		return limitsEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getLimits_NearFraction() {
		return (EAttribute)limitsEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getWindingLeakage() {
		return windingLeakageEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getWindingLeakage_First() {
		return (EReference)windingLeakageEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getWindingLeakage_Second() {
		return (EReference)windingLeakageEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getWindingLeakage_Arrangement() {
		return (EAttribute)windingLeakageEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getWindingLeakage_FirstBuild() {
		return (EAttribute)windingLeakageEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getWindingLeakage_SecondBuild() {
		return (EAttribute)windingLeakageEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getWindingLeakage_Separation() {
		return (EAttribute)windingLeakageEClass.getEStructuralFeatures().get(5);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getWindingLeakage_Height() {
		return (EAttribute)windingLeakageEClass.getEStructuralFeatures().get(6);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getWindingLeakage_MeanTurn() {
		return (EAttribute)windingLeakageEClass.getEStructuralFeatures().get(7);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getWindingLeakage_Interfaces() {
		return (EAttribute)windingLeakageEClass.getEStructuralFeatures().get(8);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getWindingConnection() {
		return windingConnectionEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getWindingConnection_Kind() {
		return (EAttribute)windingConnectionEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getWindingConnection_Members() {
		return (EReference)windingConnectionEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getConnectedWinding() {
		return connectedWindingEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getConnectedWinding_Winding() {
		return (EReference)connectedWindingEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getConnectedWinding_Reversed() {
		return (EAttribute)connectedWindingEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getTolerance() {
		return toleranceEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getTolerance_Targets() {
		return (EReference)toleranceEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getTolerance_Feature() {
		return (EAttribute)toleranceEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getTolerance_Deviation() {
		return (EAttribute)toleranceEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getTolerance_Distribution() {
		return (EAttribute)toleranceEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getSectionShape() {
		return sectionShapeEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getFringing() {
		return fringingEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getGapPlace() {
		return gapPlaceEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getCurveScaling() {
		return curveScalingEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getVoltageWaveform() {
		return voltageWaveformEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getWindingArrangement() {
		return windingArrangementEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getConnectionKind() {
		return connectionKindEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getTolerancedFeature() {
		return tolerancedFeatureEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getDistribution() {
		return distributionEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EDataType getLength() {
		return lengthEDataType;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EDataType getArea() {
		return areaEDataType;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EDataType getFluxDensity() {
		return fluxDensityEDataType;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EDataType getFieldStrength() {
		return fieldStrengthEDataType;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EDataType getCurrent() {
		return currentEDataType;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EDataType getVoltage() {
		return voltageEDataType;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EDataType getTime() {
		return timeEDataType;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EDataType getTemperature() {
		return temperatureEDataType;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EDataType getFrequency() {
		return frequencyEDataType;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EDataType getResistance() {
		return resistanceEDataType;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EDataType getPermeance() {
		return permeanceEDataType;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EDataType getDensity() {
		return densityEDataType;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EDataType getWire() {
		return wireEDataType;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EDataType getDeviation() {
		return deviationEDataType;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public GapwrightFactory getGapwrightFactory() {
		return (GapwrightFactory)getEFactoryInstance();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private boolean isCreated = false;

	/**
	 * Creates the meta-model objects for the package.  This method is
	 * guarded to have no affect on any invocation but its first.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public void createPackageContents() {
		if (isCreated) return;
		isCreated = true;

		// Create classes and their features
		designEClass = createEClass(DESIGN);
		createEAttribute(designEClass, DESIGN__NAME);
		createEAttribute(designEClass, DESIGN__NOTES);
		createEReference(designEClass, DESIGN__MATERIALS);
		createEReference(designEClass, DESIGN__JOINTS);
		createEReference(designEClass, DESIGN__LEGS);
		createEReference(designEClass, DESIGN__AIR_PATHS);
		createEReference(designEClass, DESIGN__WINDINGS);
		createEReference(designEClass, DESIGN__OPERATING_POINTS);
		createEReference(designEClass, DESIGN__LIMITS);
		createEReference(designEClass, DESIGN__LEAKAGES);
		createEReference(designEClass, DESIGN__CONNECTIONS);
		createEReference(designEClass, DESIGN__TOLERANCES);

		elementEClass = createEClass(ELEMENT);
		createEAttribute(elementEClass, ELEMENT__ID);
		createEAttribute(elementEClass, ELEMENT__NAME);

		jointEClass = createEClass(JOINT);
		createEAttribute(jointEClass, JOINT__X);
		createEAttribute(jointEClass, JOINT__Y);

		legEClass = createEClass(LEG);
		createEReference(legEClass, LEG__FROM);
		createEReference(legEClass, LEG__TO);
		createEReference(legEClass, LEG__MATERIAL);
		createEAttribute(legEClass, LEG__SHAPE);
		createEAttribute(legEClass, LEG__WIDTH);
		createEAttribute(legEClass, LEG__DEPTH);
		createEAttribute(legEClass, LEG__DIAMETER);
		createEAttribute(legEClass, LEG__AREA);
		createEAttribute(legEClass, LEG__STACKING_FACTOR);
		createEAttribute(legEClass, LEG__PATH_LENGTH);
		createEReference(legEClass, LEG__GAPS);
		createEReference(legEClass, LEG__MAGNET);

		gapEClass = createEClass(GAP);
		createEAttribute(gapEClass, GAP__LENGTH);
		createEAttribute(gapEClass, GAP__PIECES);
		createEAttribute(gapEClass, GAP__FRINGING);
		createEAttribute(gapEClass, GAP__WINDOW_HEIGHT);
		createEAttribute(gapEClass, GAP__POSITION);
		createEAttribute(gapEClass, GAP__PLACE);

		magnetEClass = createEClass(MAGNET);
		createEAttribute(magnetEClass, MAGNET__LENGTH);
		createEAttribute(magnetEClass, MAGNET__REMANENCE);
		createEAttribute(magnetEClass, MAGNET__RECOIL_PERMEABILITY);
		createEAttribute(magnetEClass, MAGNET__REVERSED);
		createEAttribute(magnetEClass, MAGNET__POSITION);

		airPathEClass = createEClass(AIR_PATH);
		createEReference(airPathEClass, AIR_PATH__FROM);
		createEReference(airPathEClass, AIR_PATH__TO);
		createEAttribute(airPathEClass, AIR_PATH__PERMEANCE);
		createEAttribute(airPathEClass, AIR_PATH__AREA);
		createEAttribute(airPathEClass, AIR_PATH__LENGTH);
		createEAttribute(airPathEClass, AIR_PATH__LEAKAGE);

		windingEClass = createEClass(WINDING);
		createEReference(windingEClass, WINDING__COILS);
		createEAttribute(windingEClass, WINDING__WIRE);
		createEAttribute(windingEClass, WINDING__RESISTANCE);

		coilEClass = createEClass(COIL);
		createEReference(coilEClass, COIL__LEG);
		createEAttribute(coilEClass, COIL__TURNS);
		createEAttribute(coilEClass, COIL__REVERSED);
		createEAttribute(coilEClass, COIL__POSITION);

		materialEClass = createEClass(MATERIAL);
		createEReference(materialEClass, MATERIAL__CURVE);
		createEReference(materialEClass, MATERIAL__SATURATIONS);
		createEReference(materialEClass, MATERIAL__LOSS);
		createEAttribute(materialEClass, MATERIAL__DENSITY);
		createEAttribute(materialEClass, MATERIAL__SOURCE);
		createEAttribute(materialEClass, MATERIAL__CURVE_TEMPERATURE);
		createEAttribute(materialEClass, MATERIAL__CURVE_SCALING);
		createEReference(materialEClass, MATERIAL__OTHER_CURVES);
		createEReference(materialEClass, MATERIAL__PERMEABILITIES);
		createEAttribute(materialEClass, MATERIAL__CURIE_TEMPERATURE);

		curveEClass = createEClass(CURVE);

		linearCurveEClass = createEClass(LINEAR_CURVE);
		createEAttribute(linearCurveEClass, LINEAR_CURVE__RELATIVE_PERMEABILITY);

		kneeCurveEClass = createEClass(KNEE_CURVE);
		createEAttribute(kneeCurveEClass, KNEE_CURVE__INITIAL_PERMEABILITY);
		createEAttribute(kneeCurveEClass, KNEE_CURVE__SATURATION_POLARISATION);

		arctanCurveEClass = createEClass(ARCTAN_CURVE);
		createEAttribute(arctanCurveEClass, ARCTAN_CURVE__INITIAL_PERMEABILITY);
		createEAttribute(arctanCurveEClass, ARCTAN_CURVE__SATURATION_POLARISATION);

		tableCurveEClass = createEClass(TABLE_CURVE);
		createEReference(tableCurveEClass, TABLE_CURVE__POINTS);

		curvePointEClass = createEClass(CURVE_POINT);
		createEAttribute(curvePointEClass, CURVE_POINT__FIELD_STRENGTH);
		createEAttribute(curvePointEClass, CURVE_POINT__FLUX_DENSITY);

		rollOffCurveEClass = createEClass(ROLL_OFF_CURVE);
		createEAttribute(rollOffCurveEClass, ROLL_OFF_CURVE__INITIAL_PERMEABILITY);
		createEAttribute(rollOffCurveEClass, ROLL_OFF_CURVE__HALF_FIELD_STRENGTH);
		createEAttribute(rollOffCurveEClass, ROLL_OFF_CURVE__EXPONENT);

		saturationEClass = createEClass(SATURATION);
		createEAttribute(saturationEClass, SATURATION__TEMPERATURE);
		createEAttribute(saturationEClass, SATURATION__FLUX_DENSITY);

		curveAtTemperatureEClass = createEClass(CURVE_AT_TEMPERATURE);
		createEAttribute(curveAtTemperatureEClass, CURVE_AT_TEMPERATURE__TEMPERATURE);
		createEReference(curveAtTemperatureEClass, CURVE_AT_TEMPERATURE__CURVE);

		initialPermeabilityEClass = createEClass(INITIAL_PERMEABILITY);
		createEAttribute(initialPermeabilityEClass, INITIAL_PERMEABILITY__TEMPERATURE);
		createEAttribute(initialPermeabilityEClass, INITIAL_PERMEABILITY__RELATIVE_PERMEABILITY);

		steinmetzLossEClass = createEClass(STEINMETZ_LOSS);
		createEAttribute(steinmetzLossEClass, STEINMETZ_LOSS__COEFFICIENT);
		createEAttribute(steinmetzLossEClass, STEINMETZ_LOSS__FREQUENCY_EXPONENT);
		createEAttribute(steinmetzLossEClass, STEINMETZ_LOSS__FLUX_DENSITY_EXPONENT);
		createEAttribute(steinmetzLossEClass, STEINMETZ_LOSS__MINIMUM_FREQUENCY);
		createEAttribute(steinmetzLossEClass, STEINMETZ_LOSS__MAXIMUM_FREQUENCY);
		createEAttribute(steinmetzLossEClass, STEINMETZ_LOSS__TEMPERATURE);

		operatingPointEClass = createEClass(OPERATING_POINT);
		createEAttribute(operatingPointEClass, OPERATING_POINT__TEMPERATURE);
		createEAttribute(operatingPointEClass, OPERATING_POINT__FREQUENCY);
		createEReference(operatingPointEClass, OPERATING_POINT__DRIVES);

		driveEClass = createEClass(DRIVE);
		createEReference(driveEClass, DRIVE__WINDING);

		currentDriveEClass = createEClass(CURRENT_DRIVE);
		createEAttribute(currentDriveEClass, CURRENT_DRIVE__CURRENT);
		createEAttribute(currentDriveEClass, CURRENT_DRIVE__RIPPLE);

		voltageDriveEClass = createEClass(VOLTAGE_DRIVE);
		createEAttribute(voltageDriveEClass, VOLTAGE_DRIVE__VOLTAGE);
		createEAttribute(voltageDriveEClass, VOLTAGE_DRIVE__ON_TIME);
		createEAttribute(voltageDriveEClass, VOLTAGE_DRIVE__BIAS);
		createEAttribute(voltageDriveEClass, VOLTAGE_DRIVE__WAVEFORM);

		limitsEClass = createEClass(LIMITS);
		createEAttribute(limitsEClass, LIMITS__NEAR_FRACTION);

		windingLeakageEClass = createEClass(WINDING_LEAKAGE);
		createEReference(windingLeakageEClass, WINDING_LEAKAGE__FIRST);
		createEReference(windingLeakageEClass, WINDING_LEAKAGE__SECOND);
		createEAttribute(windingLeakageEClass, WINDING_LEAKAGE__ARRANGEMENT);
		createEAttribute(windingLeakageEClass, WINDING_LEAKAGE__FIRST_BUILD);
		createEAttribute(windingLeakageEClass, WINDING_LEAKAGE__SECOND_BUILD);
		createEAttribute(windingLeakageEClass, WINDING_LEAKAGE__SEPARATION);
		createEAttribute(windingLeakageEClass, WINDING_LEAKAGE__HEIGHT);
		createEAttribute(windingLeakageEClass, WINDING_LEAKAGE__MEAN_TURN);
		createEAttribute(windingLeakageEClass, WINDING_LEAKAGE__INTERFACES);

		windingConnectionEClass = createEClass(WINDING_CONNECTION);
		createEAttribute(windingConnectionEClass, WINDING_CONNECTION__KIND);
		createEReference(windingConnectionEClass, WINDING_CONNECTION__MEMBERS);

		connectedWindingEClass = createEClass(CONNECTED_WINDING);
		createEReference(connectedWindingEClass, CONNECTED_WINDING__WINDING);
		createEAttribute(connectedWindingEClass, CONNECTED_WINDING__REVERSED);

		toleranceEClass = createEClass(TOLERANCE);
		createEReference(toleranceEClass, TOLERANCE__TARGETS);
		createEAttribute(toleranceEClass, TOLERANCE__FEATURE);
		createEAttribute(toleranceEClass, TOLERANCE__DEVIATION);
		createEAttribute(toleranceEClass, TOLERANCE__DISTRIBUTION);

		// Create enums
		sectionShapeEEnum = createEEnum(SECTION_SHAPE);
		fringingEEnum = createEEnum(FRINGING);
		gapPlaceEEnum = createEEnum(GAP_PLACE);
		curveScalingEEnum = createEEnum(CURVE_SCALING);
		voltageWaveformEEnum = createEEnum(VOLTAGE_WAVEFORM);
		windingArrangementEEnum = createEEnum(WINDING_ARRANGEMENT);
		connectionKindEEnum = createEEnum(CONNECTION_KIND);
		tolerancedFeatureEEnum = createEEnum(TOLERANCED_FEATURE);
		distributionEEnum = createEEnum(DISTRIBUTION);

		// Create data types
		lengthEDataType = createEDataType(LENGTH);
		areaEDataType = createEDataType(AREA);
		fluxDensityEDataType = createEDataType(FLUX_DENSITY);
		fieldStrengthEDataType = createEDataType(FIELD_STRENGTH);
		currentEDataType = createEDataType(CURRENT);
		voltageEDataType = createEDataType(VOLTAGE);
		timeEDataType = createEDataType(TIME);
		temperatureEDataType = createEDataType(TEMPERATURE);
		frequencyEDataType = createEDataType(FREQUENCY);
		resistanceEDataType = createEDataType(RESISTANCE);
		permeanceEDataType = createEDataType(PERMEANCE);
		densityEDataType = createEDataType(DENSITY);
		wireEDataType = createEDataType(WIRE);
		deviationEDataType = createEDataType(DEVIATION);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private boolean isInitialized = false;

	/**
	 * Complete the initialization of the package and its meta-model.  This
	 * method is guarded to have no affect on any invocation but its first.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public void initializePackageContents() {
		if (isInitialized) return;
		isInitialized = true;

		// Initialize package
		setName(eNAME);
		setNsPrefix(eNS_PREFIX);
		setNsURI(eNS_URI);

		// Create type parameters

		// Set bounds for type parameters

		// Add supertypes to classes
		jointEClass.getESuperTypes().add(this.getElement());
		legEClass.getESuperTypes().add(this.getElement());
		gapEClass.getESuperTypes().add(this.getElement());
		magnetEClass.getESuperTypes().add(this.getElement());
		airPathEClass.getESuperTypes().add(this.getElement());
		windingEClass.getESuperTypes().add(this.getElement());
		coilEClass.getESuperTypes().add(this.getElement());
		materialEClass.getESuperTypes().add(this.getElement());
		linearCurveEClass.getESuperTypes().add(this.getCurve());
		kneeCurveEClass.getESuperTypes().add(this.getCurve());
		arctanCurveEClass.getESuperTypes().add(this.getCurve());
		tableCurveEClass.getESuperTypes().add(this.getCurve());
		rollOffCurveEClass.getESuperTypes().add(this.getCurve());
		operatingPointEClass.getESuperTypes().add(this.getElement());
		driveEClass.getESuperTypes().add(this.getElement());
		currentDriveEClass.getESuperTypes().add(this.getDrive());
		voltageDriveEClass.getESuperTypes().add(this.getDrive());
		windingLeakageEClass.getESuperTypes().add(this.getElement());
		windingConnectionEClass.getESuperTypes().add(this.getElement());
		toleranceEClass.getESuperTypes().add(this.getElement());

		// Initialize classes and features; add operations and parameters
		initEClass(designEClass, Design.class, "Design", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getDesign_Name(), ecorePackage.getEString(), "name", null, 0, 1, Design.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getDesign_Notes(), ecorePackage.getEString(), "notes", null, 0, 1, Design.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getDesign_Materials(), this.getMaterial(), null, "materials", null, 0, -1, Design.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getDesign_Joints(), this.getJoint(), null, "joints", null, 0, -1, Design.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getDesign_Legs(), this.getLeg(), null, "legs", null, 0, -1, Design.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getDesign_AirPaths(), this.getAirPath(), null, "airPaths", null, 0, -1, Design.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getDesign_Windings(), this.getWinding(), null, "windings", null, 0, -1, Design.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getDesign_OperatingPoints(), this.getOperatingPoint(), null, "operatingPoints", null, 0, -1, Design.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getDesign_Limits(), this.getLimits(), null, "limits", null, 0, 1, Design.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getDesign_Leakages(), this.getWindingLeakage(), null, "leakages", null, 0, -1, Design.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getDesign_Connections(), this.getWindingConnection(), null, "connections", null, 0, -1, Design.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getDesign_Tolerances(), this.getTolerance(), null, "tolerances", null, 0, -1, Design.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(elementEClass, Element.class, "Element", IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getElement_Id(), ecorePackage.getEString(), "id", null, 1, 1, Element.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getElement_Name(), ecorePackage.getEString(), "name", null, 0, 1, Element.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(jointEClass, Joint.class, "Joint", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getJoint_X(), this.getLength(), "x", null, 1, 1, Joint.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getJoint_Y(), this.getLength(), "y", null, 1, 1, Joint.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(legEClass, Leg.class, "Leg", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEReference(getLeg_From(), this.getJoint(), null, "from", null, 1, 1, Leg.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getLeg_To(), this.getJoint(), null, "to", null, 1, 1, Leg.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getLeg_Material(), this.getMaterial(), null, "material", null, 1, 1, Leg.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getLeg_Shape(), this.getSectionShape(), "shape", null, 0, 1, Leg.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getLeg_Width(), this.getLength(), "width", null, 0, 1, Leg.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getLeg_Depth(), this.getLength(), "depth", null, 0, 1, Leg.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getLeg_Diameter(), this.getLength(), "diameter", null, 0, 1, Leg.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getLeg_Area(), this.getArea(), "area", null, 0, 1, Leg.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getLeg_StackingFactor(), ecorePackage.getEDouble(), "stackingFactor", "1", 0, 1, Leg.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getLeg_PathLength(), this.getLength(), "pathLength", null, 0, 1, Leg.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getLeg_Gaps(), this.getGap(), null, "gaps", null, 0, -1, Leg.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getLeg_Magnet(), this.getMagnet(), null, "magnet", null, 0, 1, Leg.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(gapEClass, Gap.class, "Gap", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getGap_Length(), this.getLength(), "length", null, 1, 1, Gap.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getGap_Pieces(), ecorePackage.getEInt(), "pieces", "1", 0, 1, Gap.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getGap_Fringing(), this.getFringing(), "fringing", null, 0, 1, Gap.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getGap_WindowHeight(), this.getLength(), "windowHeight", null, 0, 1, Gap.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getGap_Position(), ecorePackage.getEDouble(), "position", "0.5", 0, 1, Gap.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getGap_Place(), this.getGapPlace(), "place", null, 0, 1, Gap.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(magnetEClass, Magnet.class, "Magnet", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getMagnet_Length(), this.getLength(), "length", null, 1, 1, Magnet.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getMagnet_Remanence(), this.getFluxDensity(), "remanence", null, 1, 1, Magnet.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getMagnet_RecoilPermeability(), ecorePackage.getEDouble(), "recoilPermeability", "1.05", 0, 1, Magnet.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getMagnet_Reversed(), ecorePackage.getEBoolean(), "reversed", null, 0, 1, Magnet.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getMagnet_Position(), ecorePackage.getEDouble(), "position", "0.5", 0, 1, Magnet.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(airPathEClass, AirPath.class, "AirPath", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEReference(getAirPath_From(), this.getJoint(), null, "from", null, 1, 1, AirPath.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getAirPath_To(), this.getJoint(), null, "to", null, 1, 1, AirPath.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getAirPath_Permeance(), this.getPermeance(), "permeance", null, 0, 1, AirPath.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getAirPath_Area(), this.getArea(), "area", null, 0, 1, AirPath.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getAirPath_Length(), this.getLength(), "length", null, 0, 1, AirPath.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getAirPath_Leakage(), ecorePackage.getEBoolean(), "leakage", null, 0, 1, AirPath.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(windingEClass, Winding.class, "Winding", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEReference(getWinding_Coils(), this.getCoil(), null, "coils", null, 0, -1, Winding.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getWinding_Wire(), this.getWire(), "wire", null, 0, 1, Winding.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getWinding_Resistance(), this.getResistance(), "resistance", null, 0, 1, Winding.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(coilEClass, Coil.class, "Coil", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEReference(getCoil_Leg(), this.getLeg(), null, "leg", null, 1, 1, Coil.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getCoil_Turns(), ecorePackage.getEInt(), "turns", null, 1, 1, Coil.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getCoil_Reversed(), ecorePackage.getEBoolean(), "reversed", null, 0, 1, Coil.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getCoil_Position(), ecorePackage.getEDouble(), "position", "0.5", 0, 1, Coil.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(materialEClass, Material.class, "Material", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEReference(getMaterial_Curve(), this.getCurve(), null, "curve", null, 1, 1, Material.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getMaterial_Saturations(), this.getSaturation(), null, "saturations", null, 0, -1, Material.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getMaterial_Loss(), this.getSteinmetzLoss(), null, "loss", null, 0, 1, Material.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getMaterial_Density(), this.getDensity(), "density", null, 0, 1, Material.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getMaterial_Source(), ecorePackage.getEString(), "source", null, 0, 1, Material.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getMaterial_CurveTemperature(), this.getTemperature(), "curveTemperature", null, 0, 1, Material.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getMaterial_CurveScaling(), this.getCurveScaling(), "curveScaling", null, 0, 1, Material.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getMaterial_OtherCurves(), this.getCurveAtTemperature(), null, "otherCurves", null, 0, -1, Material.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getMaterial_Permeabilities(), this.getInitialPermeability(), null, "permeabilities", null, 0, -1, Material.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getMaterial_CurieTemperature(), this.getTemperature(), "curieTemperature", null, 0, 1, Material.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(curveEClass, Curve.class, "Curve", IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);

		initEClass(linearCurveEClass, LinearCurve.class, "LinearCurve", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getLinearCurve_RelativePermeability(), ecorePackage.getEDouble(), "relativePermeability", null, 1, 1, LinearCurve.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(kneeCurveEClass, KneeCurve.class, "KneeCurve", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getKneeCurve_InitialPermeability(), ecorePackage.getEDouble(), "initialPermeability", null, 1, 1, KneeCurve.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getKneeCurve_SaturationPolarisation(), this.getFluxDensity(), "saturationPolarisation", null, 1, 1, KneeCurve.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(arctanCurveEClass, ArctanCurve.class, "ArctanCurve", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getArctanCurve_InitialPermeability(), ecorePackage.getEDouble(), "initialPermeability", null, 1, 1, ArctanCurve.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getArctanCurve_SaturationPolarisation(), this.getFluxDensity(), "saturationPolarisation", null, 1, 1, ArctanCurve.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(tableCurveEClass, TableCurve.class, "TableCurve", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEReference(getTableCurve_Points(), this.getCurvePoint(), null, "points", null, 0, -1, TableCurve.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(curvePointEClass, CurvePoint.class, "CurvePoint", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getCurvePoint_FieldStrength(), this.getFieldStrength(), "fieldStrength", null, 1, 1, CurvePoint.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getCurvePoint_FluxDensity(), this.getFluxDensity(), "fluxDensity", null, 1, 1, CurvePoint.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(rollOffCurveEClass, RollOffCurve.class, "RollOffCurve", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getRollOffCurve_InitialPermeability(), ecorePackage.getEDouble(), "initialPermeability", null, 1, 1, RollOffCurve.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getRollOffCurve_HalfFieldStrength(), this.getFieldStrength(), "halfFieldStrength", null, 1, 1, RollOffCurve.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getRollOffCurve_Exponent(), ecorePackage.getEDouble(), "exponent", null, 1, 1, RollOffCurve.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(saturationEClass, Saturation.class, "Saturation", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getSaturation_Temperature(), this.getTemperature(), "temperature", null, 1, 1, Saturation.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSaturation_FluxDensity(), this.getFluxDensity(), "fluxDensity", null, 1, 1, Saturation.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(curveAtTemperatureEClass, CurveAtTemperature.class, "CurveAtTemperature", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getCurveAtTemperature_Temperature(), this.getTemperature(), "temperature", null, 1, 1, CurveAtTemperature.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getCurveAtTemperature_Curve(), this.getCurve(), null, "curve", null, 1, 1, CurveAtTemperature.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(initialPermeabilityEClass, InitialPermeability.class, "InitialPermeability", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getInitialPermeability_Temperature(), this.getTemperature(), "temperature", null, 1, 1, InitialPermeability.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getInitialPermeability_RelativePermeability(), ecorePackage.getEDouble(), "relativePermeability", null, 1, 1, InitialPermeability.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(steinmetzLossEClass, SteinmetzLoss.class, "SteinmetzLoss", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getSteinmetzLoss_Coefficient(), ecorePackage.getEDouble(), "coefficient", null, 1, 1, SteinmetzLoss.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSteinmetzLoss_FrequencyExponent(), ecorePackage.getEDouble(), "frequencyExponent", null, 1, 1, SteinmetzLoss.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSteinmetzLoss_FluxDensityExponent(), ecorePackage.getEDouble(), "fluxDensityExponent", null, 1, 1, SteinmetzLoss.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSteinmetzLoss_MinimumFrequency(), this.getFrequency(), "minimumFrequency", null, 0, 1, SteinmetzLoss.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSteinmetzLoss_MaximumFrequency(), this.getFrequency(), "maximumFrequency", null, 0, 1, SteinmetzLoss.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSteinmetzLoss_Temperature(), this.getTemperature(), "temperature", null, 0, 1, SteinmetzLoss.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(operatingPointEClass, OperatingPoint.class, "OperatingPoint", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getOperatingPoint_Temperature(), this.getTemperature(), "temperature", null, 1, 1, OperatingPoint.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getOperatingPoint_Frequency(), this.getFrequency(), "frequency", null, 0, 1, OperatingPoint.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getOperatingPoint_Drives(), this.getDrive(), null, "drives", null, 0, -1, OperatingPoint.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(driveEClass, Drive.class, "Drive", IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEReference(getDrive_Winding(), this.getWinding(), null, "winding", null, 1, 1, Drive.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(currentDriveEClass, CurrentDrive.class, "CurrentDrive", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getCurrentDrive_Current(), this.getCurrent(), "current", null, 1, 1, CurrentDrive.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getCurrentDrive_Ripple(), this.getCurrent(), "ripple", "0 A", 0, 1, CurrentDrive.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(voltageDriveEClass, VoltageDrive.class, "VoltageDrive", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getVoltageDrive_Voltage(), this.getVoltage(), "voltage", null, 1, 1, VoltageDrive.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getVoltageDrive_OnTime(), this.getTime(), "onTime", null, 1, 1, VoltageDrive.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getVoltageDrive_Bias(), this.getCurrent(), "bias", "0 A", 0, 1, VoltageDrive.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getVoltageDrive_Waveform(), this.getVoltageWaveform(), "waveform", null, 0, 1, VoltageDrive.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(limitsEClass, Limits.class, "Limits", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getLimits_NearFraction(), ecorePackage.getEDouble(), "nearFraction", "0.8", 0, 1, Limits.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(windingLeakageEClass, WindingLeakage.class, "WindingLeakage", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEReference(getWindingLeakage_First(), this.getWinding(), null, "first", null, 1, 1, WindingLeakage.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getWindingLeakage_Second(), this.getWinding(), null, "second", null, 1, 1, WindingLeakage.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getWindingLeakage_Arrangement(), this.getWindingArrangement(), "arrangement", null, 0, 1, WindingLeakage.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getWindingLeakage_FirstBuild(), this.getLength(), "firstBuild", null, 1, 1, WindingLeakage.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getWindingLeakage_SecondBuild(), this.getLength(), "secondBuild", null, 1, 1, WindingLeakage.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getWindingLeakage_Separation(), this.getLength(), "separation", null, 1, 1, WindingLeakage.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getWindingLeakage_Height(), this.getLength(), "height", null, 1, 1, WindingLeakage.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getWindingLeakage_MeanTurn(), this.getLength(), "meanTurn", null, 1, 1, WindingLeakage.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getWindingLeakage_Interfaces(), ecorePackage.getEInt(), "interfaces", "1", 0, 1, WindingLeakage.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(windingConnectionEClass, WindingConnection.class, "WindingConnection", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getWindingConnection_Kind(), this.getConnectionKind(), "kind", null, 0, 1, WindingConnection.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getWindingConnection_Members(), this.getConnectedWinding(), null, "members", null, 0, -1, WindingConnection.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(connectedWindingEClass, ConnectedWinding.class, "ConnectedWinding", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEReference(getConnectedWinding_Winding(), this.getWinding(), null, "winding", null, 1, 1, ConnectedWinding.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getConnectedWinding_Reversed(), ecorePackage.getEBoolean(), "reversed", null, 0, 1, ConnectedWinding.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(toleranceEClass, Tolerance.class, "Tolerance", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEReference(getTolerance_Targets(), this.getElement(), null, "targets", null, 0, -1, Tolerance.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getTolerance_Feature(), this.getTolerancedFeature(), "feature", null, 0, 1, Tolerance.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getTolerance_Deviation(), this.getDeviation(), "deviation", null, 1, 1, Tolerance.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getTolerance_Distribution(), this.getDistribution(), "distribution", null, 0, 1, Tolerance.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		// Initialize enums and add enum literals
		initEEnum(sectionShapeEEnum, SectionShape.class, "SectionShape");
		addEEnumLiteral(sectionShapeEEnum, SectionShape.RECTANGULAR);
		addEEnumLiteral(sectionShapeEEnum, SectionShape.ROUND);
		addEEnumLiteral(sectionShapeEEnum, SectionShape.GIVEN);

		initEEnum(fringingEEnum, Fringing.class, "Fringing");
		addEEnumLiteral(fringingEEnum, Fringing.NONE);
		addEEnumLiteral(fringingEEnum, Fringing.WIDENED);
		addEEnumLiteral(fringingEEnum, Fringing.LOGARITHMIC);
		addEEnumLiteral(fringingEEnum, Fringing.CONFORMAL);

		initEEnum(gapPlaceEEnum, GapPlace.class, "GapPlace");
		addEEnumLiteral(gapPlaceEEnum, GapPlace.WITHIN_LEG);
		addEEnumLiteral(gapPlaceEEnum, GapPlace.AGAINST_YOKE);
		addEEnumLiteral(gapPlaceEEnum, GapPlace.BETWEEN_POLES);

		initEEnum(curveScalingEEnum, CurveScaling.class, "CurveScaling");
		addEEnumLiteral(curveScalingEEnum, CurveScaling.FIXED);
		addEEnumLiteral(curveScalingEEnum, CurveScaling.WITH_SATURATION);

		initEEnum(voltageWaveformEEnum, VoltageWaveform.class, "VoltageWaveform");
		addEEnumLiteral(voltageWaveformEEnum, VoltageWaveform.RECTANGULAR);
		addEEnumLiteral(voltageWaveformEEnum, VoltageWaveform.TRIANGULAR);
		addEEnumLiteral(voltageWaveformEEnum, VoltageWaveform.SINUSOIDAL);

		initEEnum(windingArrangementEEnum, WindingArrangement.class, "WindingArrangement");
		addEEnumLiteral(windingArrangementEEnum, WindingArrangement.CONCENTRIC);
		addEEnumLiteral(windingArrangementEEnum, WindingArrangement.SIDE_BY_SIDE);

		initEEnum(connectionKindEEnum, ConnectionKind.class, "ConnectionKind");
		addEEnumLiteral(connectionKindEEnum, ConnectionKind.SERIES);
		addEEnumLiteral(connectionKindEEnum, ConnectionKind.PARALLEL);

		initEEnum(tolerancedFeatureEEnum, TolerancedFeature.class, "TolerancedFeature");
		addEEnumLiteral(tolerancedFeatureEEnum, TolerancedFeature.GAP_LENGTH);
		addEEnumLiteral(tolerancedFeatureEEnum, TolerancedFeature.WIDTH);
		addEEnumLiteral(tolerancedFeatureEEnum, TolerancedFeature.DEPTH);
		addEEnumLiteral(tolerancedFeatureEEnum, TolerancedFeature.DIAMETER);
		addEEnumLiteral(tolerancedFeatureEEnum, TolerancedFeature.AREA);
		addEEnumLiteral(tolerancedFeatureEEnum, TolerancedFeature.PATH_LENGTH);
		addEEnumLiteral(tolerancedFeatureEEnum, TolerancedFeature.STACKING_FACTOR);
		addEEnumLiteral(tolerancedFeatureEEnum, TolerancedFeature.MAGNET_LENGTH);
		addEEnumLiteral(tolerancedFeatureEEnum, TolerancedFeature.REMANENCE);
		addEEnumLiteral(tolerancedFeatureEEnum, TolerancedFeature.PERMEABILITY);
		addEEnumLiteral(tolerancedFeatureEEnum, TolerancedFeature.SATURATION);
		addEEnumLiteral(tolerancedFeatureEEnum, TolerancedFeature.CURRENT);

		initEEnum(distributionEEnum, Distribution.class, "Distribution");
		addEEnumLiteral(distributionEEnum, Distribution.UNIFORM);
		addEEnumLiteral(distributionEEnum, Distribution.NORMAL);

		// Initialize data types
		initEDataType(lengthEDataType, Quantity.class, "Length", IS_SERIALIZABLE, !IS_GENERATED_INSTANCE_CLASS);
		initEDataType(areaEDataType, Quantity.class, "Area", IS_SERIALIZABLE, !IS_GENERATED_INSTANCE_CLASS);
		initEDataType(fluxDensityEDataType, Quantity.class, "FluxDensity", IS_SERIALIZABLE, !IS_GENERATED_INSTANCE_CLASS);
		initEDataType(fieldStrengthEDataType, Quantity.class, "FieldStrength", IS_SERIALIZABLE, !IS_GENERATED_INSTANCE_CLASS);
		initEDataType(currentEDataType, Quantity.class, "Current", IS_SERIALIZABLE, !IS_GENERATED_INSTANCE_CLASS);
		initEDataType(voltageEDataType, Quantity.class, "Voltage", IS_SERIALIZABLE, !IS_GENERATED_INSTANCE_CLASS);
		initEDataType(timeEDataType, Quantity.class, "Time", IS_SERIALIZABLE, !IS_GENERATED_INSTANCE_CLASS);
		initEDataType(temperatureEDataType, Quantity.class, "Temperature", IS_SERIALIZABLE, !IS_GENERATED_INSTANCE_CLASS);
		initEDataType(frequencyEDataType, Quantity.class, "Frequency", IS_SERIALIZABLE, !IS_GENERATED_INSTANCE_CLASS);
		initEDataType(resistanceEDataType, Quantity.class, "Resistance", IS_SERIALIZABLE, !IS_GENERATED_INSTANCE_CLASS);
		initEDataType(permeanceEDataType, Quantity.class, "Permeance", IS_SERIALIZABLE, !IS_GENERATED_INSTANCE_CLASS);
		initEDataType(densityEDataType, Quantity.class, "Density", IS_SERIALIZABLE, !IS_GENERATED_INSTANCE_CLASS);
		initEDataType(wireEDataType, Quantity.class, "Wire", IS_SERIALIZABLE, !IS_GENERATED_INSTANCE_CLASS);
		initEDataType(deviationEDataType, Quantity.class, "Deviation", IS_SERIALIZABLE, !IS_GENERATED_INSTANCE_CLASS);

		// Create resource
		createResource(eNS_URI);
	}

} //GapwrightPackageImpl
