/**
 */
package gapwright.model.provider;


import gapwright.model.GapwrightFactory;
import gapwright.model.GapwrightPackage;
import gapwright.model.Material;

import java.util.Collection;
import java.util.List;

import org.eclipse.emf.common.notify.AdapterFactory;
import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EStructuralFeature;

import org.eclipse.emf.edit.provider.ComposeableAdapterFactory;
import org.eclipse.emf.edit.provider.IItemPropertyDescriptor;
import org.eclipse.emf.edit.provider.ItemPropertyDescriptor;
import org.eclipse.emf.edit.provider.ViewerNotification;

/**
 * This is the item provider adapter for a {@link gapwright.model.Material} object.
 * <!-- begin-user-doc -->
 * <!-- end-user-doc -->
 * @generated
 */
public class MaterialItemProvider extends ElementItemProvider {
	/**
	 * This constructs an instance from a factory and a notifier.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public MaterialItemProvider(AdapterFactory adapterFactory) {
		super(adapterFactory);
	}

	/**
	 * This returns the property descriptors for the adapted class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public List<IItemPropertyDescriptor> getPropertyDescriptors(Object object) {
		if (itemPropertyDescriptors == null) {
			super.getPropertyDescriptors(object);

			addDensityPropertyDescriptor(object);
			addSourcePropertyDescriptor(object);
			addCurveTemperaturePropertyDescriptor(object);
			addCurveScalingPropertyDescriptor(object);
			addCurieTemperaturePropertyDescriptor(object);
		}
		return itemPropertyDescriptors;
	}

	/**
	 * This adds a property descriptor for the Density feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addDensityPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Material_density_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Material_density_feature", "_UI_Material_type"),
				 GapwrightPackage.Literals.MATERIAL__DENSITY,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Source feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addSourcePropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Material_source_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Material_source_feature", "_UI_Material_type"),
				 GapwrightPackage.Literals.MATERIAL__SOURCE,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Curve Temperature feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addCurveTemperaturePropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Material_curveTemperature_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Material_curveTemperature_feature", "_UI_Material_type"),
				 GapwrightPackage.Literals.MATERIAL__CURVE_TEMPERATURE,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Curve Scaling feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addCurveScalingPropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Material_curveScaling_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Material_curveScaling_feature", "_UI_Material_type"),
				 GapwrightPackage.Literals.MATERIAL__CURVE_SCALING,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This adds a property descriptor for the Curie Temperature feature.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected void addCurieTemperaturePropertyDescriptor(Object object) {
		itemPropertyDescriptors.add
			(createItemPropertyDescriptor
				(((ComposeableAdapterFactory)adapterFactory).getRootAdapterFactory(),
				 getResourceLocator(),
				 getString("_UI_Material_curieTemperature_feature"),
				 getString("_UI_PropertyDescriptor_description", "_UI_Material_curieTemperature_feature", "_UI_Material_type"),
				 GapwrightPackage.Literals.MATERIAL__CURIE_TEMPERATURE,
				 true,
				 false,
				 false,
				 ItemPropertyDescriptor.GENERIC_VALUE_IMAGE,
				 null,
				 null));
	}

	/**
	 * This specifies how to implement {@link #getChildren} and is used to deduce an appropriate feature for an
	 * {@link org.eclipse.emf.edit.command.AddCommand}, {@link org.eclipse.emf.edit.command.RemoveCommand} or
	 * {@link org.eclipse.emf.edit.command.MoveCommand} in {@link #createCommand}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Collection<? extends EStructuralFeature> getChildrenFeatures(Object object) {
		if (childrenFeatures == null) {
			super.getChildrenFeatures(object);
			childrenFeatures.add(GapwrightPackage.Literals.MATERIAL__CURVE);
			childrenFeatures.add(GapwrightPackage.Literals.MATERIAL__SATURATIONS);
			childrenFeatures.add(GapwrightPackage.Literals.MATERIAL__LOSS);
			childrenFeatures.add(GapwrightPackage.Literals.MATERIAL__OTHER_CURVES);
			childrenFeatures.add(GapwrightPackage.Literals.MATERIAL__PERMEABILITIES);
		}
		return childrenFeatures;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EStructuralFeature getChildFeature(Object object, Object child) {
		// Check the type of the specified child object and return the proper feature to use for
		// adding (see {@link AddCommand}) it as a child.

		return super.getChildFeature(object, child);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected boolean shouldComposeCreationImage() {
		return true;
	}

	/**
	 * This returns the label text for the adapted class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getText(Object object) {
		String label = ((Material)object).getName();
		return label == null || label.length() == 0 ?
			getString("_UI_Material_type") :
			getString("_UI_Material_type") + " " + label;
	}


	/**
	 * This handles model notifications by calling {@link #updateChildren} to update any cached
	 * children and by creating a viewer notification, which it passes to {@link #fireNotifyChanged}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void notifyChanged(Notification notification) {
		updateChildren(notification);

		switch (notification.getFeatureID(Material.class)) {
			case GapwrightPackage.MATERIAL__DENSITY:
			case GapwrightPackage.MATERIAL__SOURCE:
			case GapwrightPackage.MATERIAL__CURVE_TEMPERATURE:
			case GapwrightPackage.MATERIAL__CURVE_SCALING:
			case GapwrightPackage.MATERIAL__CURIE_TEMPERATURE:
				fireNotifyChanged(new ViewerNotification(notification, notification.getNotifier(), false, true));
				return;
			case GapwrightPackage.MATERIAL__CURVE:
			case GapwrightPackage.MATERIAL__SATURATIONS:
			case GapwrightPackage.MATERIAL__LOSS:
			case GapwrightPackage.MATERIAL__OTHER_CURVES:
			case GapwrightPackage.MATERIAL__PERMEABILITIES:
				fireNotifyChanged(new ViewerNotification(notification, notification.getNotifier(), true, false));
				return;
		}
		super.notifyChanged(notification);
	}

	/**
	 * This adds {@link org.eclipse.emf.edit.command.CommandParameter}s describing the children
	 * that can be created under this object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected void collectNewChildDescriptors(Collection<Object> newChildDescriptors, Object object) {
		super.collectNewChildDescriptors(newChildDescriptors, object);

		newChildDescriptors.add
			(createChildParameter
				(GapwrightPackage.Literals.MATERIAL__CURVE,
				 GapwrightFactory.eINSTANCE.createLinearCurve()));

		newChildDescriptors.add
			(createChildParameter
				(GapwrightPackage.Literals.MATERIAL__CURVE,
				 GapwrightFactory.eINSTANCE.createKneeCurve()));

		newChildDescriptors.add
			(createChildParameter
				(GapwrightPackage.Literals.MATERIAL__CURVE,
				 GapwrightFactory.eINSTANCE.createArctanCurve()));

		newChildDescriptors.add
			(createChildParameter
				(GapwrightPackage.Literals.MATERIAL__CURVE,
				 GapwrightFactory.eINSTANCE.createTableCurve()));

		newChildDescriptors.add
			(createChildParameter
				(GapwrightPackage.Literals.MATERIAL__CURVE,
				 GapwrightFactory.eINSTANCE.createRollOffCurve()));

		newChildDescriptors.add
			(createChildParameter
				(GapwrightPackage.Literals.MATERIAL__SATURATIONS,
				 GapwrightFactory.eINSTANCE.createSaturation()));

		newChildDescriptors.add
			(createChildParameter
				(GapwrightPackage.Literals.MATERIAL__LOSS,
				 GapwrightFactory.eINSTANCE.createSteinmetzLoss()));

		newChildDescriptors.add
			(createChildParameter
				(GapwrightPackage.Literals.MATERIAL__OTHER_CURVES,
				 GapwrightFactory.eINSTANCE.createCurveAtTemperature()));

		newChildDescriptors.add
			(createChildParameter
				(GapwrightPackage.Literals.MATERIAL__PERMEABILITIES,
				 GapwrightFactory.eINSTANCE.createInitialPermeability()));
	}

}
